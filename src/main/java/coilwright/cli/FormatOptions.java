package coilwright.cli;

import coilwright.problem.UnitSystem;
import picocli.CommandLine.ITypeConverter;
import picocli.CommandLine.Option;
import picocli.CommandLine.TypeConversionException;

/** How a result is written. */
final class FormatOptions {

  @Option(
      names = "--format",
      paramLabel = "text|json",
      defaultValue = "text",
      converter = FormatConverter.class,
      description = "text (the default) or json.")
  private Format format;

  @Option(
      names = "--units",
      paramLabel = "metric",
      converter = UnitsConverter.class,
      description = "Units of text, over the file's units.")
  private UnitSystem units;

  /** The formats. */
  enum Format {
    TEXT,
    JSON
  }

  boolean isJson() {
    return format == Format.JSON;
  }

  /** Reads {@code --format}. */
  static final class FormatConverter implements ITypeConverter<Format> {
    @Override
    public Format convert(String word) {
      return switch (word) {
        case "text" -> Format.TEXT;
        case "json" -> Format.JSON;
        case "csv" ->
            throw new TypeConversionException("csv is not available yet; accepted: text, json");
        default -> throw new TypeConversionException("\"" + word + "\"; accepted: text, json");
      };
    }
  }

  /** Reads {@code --units}. */
  static final class UnitsConverter implements ITypeConverter<UnitSystem> {
    @Override
    public UnitSystem convert(String word) {
      return switch (word) {
        case "metric" -> UnitSystem.METRIC;
        case "inch" ->
            throw new TypeConversionException("inch is not available yet; accepted: metric");
        default -> throw new TypeConversionException("\"" + word + "\"; accepted: metric");
      };
    }
  }
}
