package coilwright.report;

import coilwright.spring.Kind;

/** The sheets of the kinds of springs. */
public final class Sheets {

  private Sheets() {}

  /**
   * The sheet of a kind.
   *
   * @param kind the kind
   * @return its sheet
   */
  public static Sheet<?> of(Kind kind) {
    return switch (kind) {
      case COMPRESSION -> new CompressionSheet();
      case TORSION -> new TorsionSheet();
      case EXTENSION -> new ExtensionSheet();
    };
  }
}
