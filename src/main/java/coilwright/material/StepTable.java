package coilwright.material;

import coilwright.source.Evidence;
import java.util.List;

/**
 * A strength or a modulus that changes in steps: each row holds above the row before, up to and
 * including its own diameter; the first holds for all that is thinner.
 *
 * @param rows the steps, rising; the last may reach to infinity
 */
public record StepTable(List<DiameterRow> rows) implements StrengthLaw, ModulusLaw {

  /** Refuses rows that do not rise. */
  public StepTable {
    rows = DiameterRow.rising(rows);
  }

  @Override
  public double at(double diameter) {
    return rows.get(DiameterRow.indexFor(rows, diameter)).value();
  }

  @Override
  public Evidence evidenceAt(double diameter) {
    return rows.get(DiameterRow.indexFor(rows, diameter)).evidence();
  }
}
