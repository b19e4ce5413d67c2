package coilwright.rank;

import coilwright.spring.State;
import java.util.ArrayList;
import java.util.List;
import java.util.function.BiPredicate;

/**
 * Springs that differ only in an equivalent grade, or in a wire diameter within its tolerance, put
 * into one line behind the best of them.
 *
 * <p>Two are alike where they have the same ends, grades that are equivalent, wire diameters d no
 * farther apart than the larger of their tolerances t, and active coils n that this tolerance
 * explains: at the same rate and mean diameter n goes with the fourth power of d (R = G d^4/(8 D^3
 * n)), so that the counts may be apart by (1 + t/d)^4, with the thinner d. A line gathers what is
 * like its first spring, whatever the others are to each other.
 *
 * @param <S> the state of the kind of spring
 */
public final class Alike<S extends State> {

  /** Diameters this much farther apart are still no farther: it is how decimals are kept [mm]. */
  private static final double KEPT = 1e-9;

  private final Ranked<S> lead;
  private final List<Ranked<S>> also = new ArrayList<>();
  private final double diameter;
  private final double tolerance;

  private Alike(Ranked<S> lead) {
    this.lead = lead;
    this.diameter = lead.candidate().state().wire().diameter();
    this.tolerance = lead.candidate().state().wire().diameterTolerance();
  }

  /**
   * The lines of a list.
   *
   * @param ranked the springs, best first
   * @param equivalent whether a grade may be taken for another, by their ids
   * @param <S> the state of the kind of spring
   * @return the lines, by the rank of their first springs
   */
  public static <S extends State> List<Line<S>> lines(
      List<Ranked<S>> ranked, BiPredicate<String, String> equivalent) {
    List<Alike<S>> groups = new ArrayList<>();
    for (Ranked<S> next : ranked) {
      Alike<S> own = new Alike<>(next);
      Alike<S> group = first(groups, own, equivalent);
      if (group == own) {
        groups.add(own);
      } else {
        group.also.add(next);
      }
    }
    List<Line<S>> lines = new ArrayList<>(groups.size());
    for (Alike<S> group : groups) {
      lines.add(new Line<>(group.lead, group.also));
    }
    return lines;
  }

  private static <S extends State> Alike<S> first(
      List<Alike<S>> groups, Alike<S> own, BiPredicate<String, String> equivalent) {
    for (Alike<S> group : groups) {
      if (group.isLike(own, equivalent)) {
        return group;
      }
    }
    return own;
  }

  private boolean isLike(Alike<S> other, BiPredicate<String, String> equivalent) {
    double play = Math.max(tolerance, other.tolerance);
    if (!(Math.abs(diameter - other.diameter) <= play + KEPT)) {
      return false;
    }
    S mine = lead.candidate().state();
    S its = other.lead.candidate().state();
    double ratio = 1 + play / Math.min(diameter, other.diameter);
    double explained = ratio * ratio * ratio * ratio;
    return mine.endForm().equals(its.endForm())
        && Math.max(mine.coils(), its.coils()) <= explained * Math.min(mine.coils(), its.coils())
        && equivalent.test(mine.wire().grade().id(), its.wire().grade().id());
  }
}
