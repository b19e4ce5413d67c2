package coilwright.report;

import coilwright.limit.Finding;
import coilwright.unit.Dimension;
import java.io.IOException;
import java.util.List;
import java.util.function.ToDoubleFunction;

/** The values of one check, each declared once for JSON and CSV, in the order of the output. */
final class CheckFields {

  /** Which bound it is. CSV names its columns by them. */
  static final List<Field<Finding>> NAME =
      List.of(
          Word.ours("limit", finding -> finding.check().limit().text()),
          Word.ours("side", finding -> finding.check().side().id()));

  /** What was found. */
  static final List<Field<Finding>> FOUND =
      List.of(
          new Judged("value", Finding::value),
          new Judged("bound", Finding::bound),
          new UnitOf(),
          Word.ours("definition", finding -> finding.check().definition()),
          Quantities.number(
              "margin", "", 3, finding -> finding.hasMargin() ? finding.margin() : Double.NaN),
          new Judged(
              "slack",
              finding -> finding.canFail() && !finding.hasMargin() ? finding.slack() : Double.NaN),
          new Flag<>("holds", Finding::holds),
          Word.ours("source", finding -> finding.source().text()));

  private CheckFields() {}

  /**
   * A number in the unit that the check names.
   *
   * @param key the key
   * @param of the number, in the inner unit of the check's dimension; NaN where it does not apply
   */
  private record Judged(String key, ToDoubleFunction<Finding> of) implements Field<Finding> {

    @Override
    public String key(OutputUnits units) {
      return key;
    }

    @Override
    public void writeTo(Json json, Finding finding) throws IOException {
      json.number(key, value(finding, OutputUnits.METRIC));
    }

    @Override
    public String cell(Finding finding, OutputUnits units) {
      return Csv.number(value(finding, units));
    }

    private double value(Finding finding, OutputUnits units) {
      return units.data(finding.check().dimension(), of.applyAsDouble(finding));
    }
  }

  /** The unit of the numbers. */
  private record UnitOf() implements Field<Finding> {

    @Override
    public String key(OutputUnits units) {
      return "unit";
    }

    @Override
    public void writeTo(Json json, Finding finding) throws IOException {
      json.string("unit", cell(finding, OutputUnits.METRIC));
    }

    @Override
    public String cell(Finding finding, OutputUnits units) {
      Dimension dimension = finding.check().dimension();
      return units.dataSymbol(dimension);
    }
  }
}
