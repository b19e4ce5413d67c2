package coilwright.limit;

import coilwright.spring.Family;
import coilwright.spring.State;

/**
 * A limit on the travel kept before solid: where the lengths are left open it shapes the springs,
 * so that without it they would be others.
 *
 * @param limit the limit
 * @param <S> the state of the kind of spring it judges
 */
record Shaping<S extends State>(Limit<S> limit) implements Limit<S> {

  @Override
  public Check check() {
    return limit.check();
  }

  @Override
  public Finding judge(S state) {
    return limit.judge(state);
  }

  @Override
  public double[] turns(Family<S> family) {
    return limit.turns(family);
  }

  @Override
  public double expected(Family<S> family, double from, double to) {
    return limit.expected(family, from, to);
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

  @Override
  public boolean onlyAfterRounding() {
    return limit.onlyAfterRounding();
  }

  @Override
  public Family<S> dropped(Family<S> family) {
    return family.keepingNothing();
  }
}
