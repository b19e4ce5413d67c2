package coilwright.search;

import java.util.AbstractList;
import java.util.List;

/**
 * The conflicts of the wires without a candidate. Most answers are read for their candidates alone,
 * so that each conflict is worked out when it is first asked for.
 */
final class Conflicts extends AbstractList<Conflict> {

  private final List<Rejection<?>> rejections;

  Conflicts(List<? extends Rejection<?>> rejections) {
    this.rejections = List.copyOf(rejections);
  }

  @Override
  public Conflict get(int index) {
    return rejections.get(index).conflict();
  }

  @Override
  public int size() {
    return rejections.size();
  }
}
