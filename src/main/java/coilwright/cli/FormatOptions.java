package coilwright.cli;

import coilwright.problem.UnitSystem;
import java.util.List;
import java.util.function.Supplier;
import picocli.CommandLine.Option;

/** How a result is written. */
final class FormatOptions {

  @Option(
      names = "--format",
      paramLabel = "text|json",
      defaultValue = "text",
      converter = FormatConverter.class,
      description = "text (the default) or json.")
  private String format;

  @Option(
      names = "--units",
      paramLabel = "metric",
      converter = UnitsConverter.class,
      description = "Units of text, over the file's units.")
  private UnitSystem units;

  /**
   * Refuses text in units that text cannot show yet.
   *
   * @param asked the units the problem file asks for
   */
  void refuseUnitsToCome(UnitSystem asked) {
    if (units == null && asked == UnitSystem.INCH && format.equals("text")) {
      throw Refusal.usage(
          "coilwright: text in inch units is not available yet; add --units metric or --format json");
    }
  }

  /**
   * The result in the format asked for, safe to print.
   *
   * @param text writes it as text
   * @param json writes it as JSON
   */
  String of(Supplier<String> text, Supplier<String> json) {
    return format.equals("json") ? PlainText.json(json.get()) : PlainText.of(text.get());
  }

  /** Reads {@code --format}. */
  static final class FormatConverter extends WordConverter<String> {
    FormatConverter() {
      super(List.of("text", "json"), word -> word, "csv");
    }
  }

  /** Reads {@code --units}. */
  static final class UnitsConverter extends WordConverter<UnitSystem> {
    UnitsConverter() {
      super(List.of(UnitSystem.METRIC), UnitSystem::id, UnitSystem.INCH.id());
    }
  }
}
