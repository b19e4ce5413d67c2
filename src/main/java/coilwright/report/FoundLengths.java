package coilwright.report;

import coilwright.unit.Dimension;
import java.util.ArrayList;
import java.util.List;

/** The loaded lengths as columns of a list, where they are part of the answer. */
final class FoundLengths {

  /** What the columns are, begun by a blank. */
  static final String REMARK = " L1 and on are the lengths found, in the order of the loads.";

  /** The length of a spring at one of its loads. */
  interface At<S> {

    /** Length at a load, the first being 0 [mm]. */
    double length(S spring, int load);
  }

  private FoundLengths() {}

  /**
   * A list's columns with one more for each load.
   *
   * @param columns those it has
   * @param place how many stand before
   * @param loads how many loads there are
   * @param at the lengths
   * @param <S> the state of the kind of spring
   */
  static <S> List<Sheet.Column<S>> among(
      List<Sheet.Column<S>> columns, int place, int loads, At<S> at) {
    List<Sheet.Column<S>> more = new ArrayList<>(columns);
    for (int i = 0; i < loads; i++) {
      int load = i;
      String head = "L" + (load + 1);
      more.add(
          place + load,
          new Sheet.Column<>(
              head,
              Quantities.of(head, head, Dimension.LENGTH, 2, state -> at.length(state, load))));
    }
    return more;
  }
}
