package coilwright.report;

import coilwright.problem.Problem;
import coilwright.problem.UnitSystem;
import coilwright.search.SpringCheck;
import coilwright.spring.CompressionState;
import java.util.List;

/**
 * What a check shows.
 *
 * @param problem the problem, with its design
 * @param check what was found
 */
public record Checked(Problem problem, SpringCheck<CompressionState> check) implements Result {

  @Override
  public String text(UnitSystem units) {
    return CheckedText.of(this, OutputUnits.ofText(units));
  }

  @Override
  public String json() {
    return CheckedJson.of(this);
  }

  @Override
  public String csv(UnitSystem units) {
    return CheckedCsv.of(this, OutputUnits.ofData(units));
  }

  @Override
  public List<String> remarks() {
    return Warnings.full(Warnings.of(this));
  }
}
