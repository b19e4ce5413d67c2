package coilwright.report;

import coilwright.problem.Problem;
import coilwright.problem.UnitSystem;
import coilwright.search.SpringCheck;
import coilwright.spring.State;
import java.util.List;

/**
 * What a check shows.
 *
 * @param sheet what is particular to the kind of spring
 * @param problem the problem, with its design
 * @param check what was found
 * @param <S> the state of the kind of spring
 */
public record Checked<S extends State>(Sheet<S> sheet, Problem problem, SpringCheck<S> check)
    implements Result {

  @Override
  public String text(UnitSystem units) {
    return new CheckedText<>(this, OutputUnits.ofText(units)).text();
  }

  @Override
  public String json() {
    return Json.document(new CheckedJson<>(this));
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
