package coilwright.cli;

import coilwright.problem.UnitSystem;
import coilwright.report.Result;
import java.util.List;
import picocli.CommandLine.Option;

/** How a result is written. */
final class FormatOptions {

  @Option(
      names = "--format",
      paramLabel = "text|json|csv",
      defaultValue = "text",
      converter = FormatConverter.class,
      description = "text (the default), json or csv.")
  private String format;

  @Option(
      names = "--units",
      paramLabel = "metric|inch",
      converter = UnitsConverter.class,
      description = "Units of text and csv, over the file's units; json is always metric.")
  private UnitSystem units;

  /**
   * The result in the format asked for, safe to print.
   *
   * @param result the result
   * @param usual the units where none are asked for
   */
  String of(Result result, UnitSystem usual) {
    UnitSystem shown = units == null ? usual : units;
    return switch (format) {
      case "json" -> PlainText.json(result.json());
      case "csv" -> PlainText.of(result.csv(shown));
      default -> PlainText.of(result.text(shown));
    };
  }

  /**
   * Says on standard error what CSV has no room for.
   *
   * @param result the result
   * @param terminal whose standard error is meant
   */
  void remark(Result result, Terminal terminal) {
    if (format.equals("csv")) {
      result.remarks().forEach(remark -> terminal.complain("note: " + remark + "\n"));
    }
  }

  /** Reads {@code --format}. */
  static final class FormatConverter extends WordConverter<String> {
    FormatConverter() {
      super(List.of("text", "json", "csv"), word -> word);
    }
  }

  /** Reads {@code --units}. */
  static final class UnitsConverter extends WordConverter<UnitSystem> {
    UnitsConverter() {
      super(List.of(UnitSystem.values()), UnitSystem::id);
    }
  }
}
