package coilwright.limit;

import coilwright.spring.Family;
import coilwright.spring.State;

/**
 * A limit whose bound is moved outward, to tell where a spring may still come to hold the limit
 * when it is rounded.
 *
 * @param limit the limit
 * @param share how far its margin may miss [-]
 * @param <S> the state of the kind of spring it judges
 */
public record Loosened<S extends State>(Limit<S> limit, double share) implements Limit<S> {

  @Override
  public Check check() {
    return limit.check();
  }

  @Override
  public Finding judge(S state) {
    Finding finding = limit.judge(state);
    double size = finding.bound() == 0 ? 1 : Math.abs(finding.bound());
    double moved = finding.check().side().outward(finding.bound(), share * size);
    return new Finding(
        finding.check(), finding.value(), moved, finding.source(), finding.canFail());
  }

  @Override
  public double[] turns(Family<S> family) {
    return limit.turns(family);
  }

  @Override
  public boolean removable() {
    return limit.removable();
  }

  @Override
  public double sensitivity(S state) {
    return limit.sensitivity(state);
  }

  @Override
  public boolean straight() {
    return limit.straight();
  }
}
