package coilwright.report;

import coilwright.limit.CoilSet;
import coilwright.limit.Finding;
import coilwright.limit.Limit;
import coilwright.limit.Side;
import coilwright.problem.LimitName;
import coilwright.problem.Problem;
import coilwright.search.Conflict;
import coilwright.search.Nearest;
import coilwright.search.Synthesis;
import coilwright.spring.Family;
import coilwright.spring.State;
import coilwright.unit.Dimension;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;

/**
 * The way out for a wire without a candidate: the coil count at which least would have to change,
 * and every limit that would have to give way there.
 *
 * @param conflict why the wire has no candidate
 * @param coils the coil count [-]; NaN where the wire has no spring at any count
 * @param failing what fails there
 */
record WayOut(Conflict conflict, double coils, List<Miss> failing) {

  private static final int MOST_COILS_TRIED = 60;

  /**
   * A bound that fails.
   *
   * @param finding what was found
   * @param removable whether a designer may change it
   */
  record Miss(Finding finding, boolean removable) {}

  /** A coil count at a bound fails it by no more than the accuracy of the count. */
  private static final double AT_THE_BOUND = 1e-6;

  /** Copies the list. */
  WayOut {
    failing = List.copyOf(failing);
  }

  /** The way out of each conflict, the one that asks the smallest change first. */
  static <S extends State> List<WayOut> nearestFirst(
      Synthesis<S> kind, Problem problem, List<Conflict> conflicts) {
    List<Limit<S>> limits = kind.limits(problem);
    return conflicts.stream()
        .map(conflict -> of(conflict, family(kind, problem, conflict), limits))
        .sorted(Comparator.comparingDouble(WayOut::shortfall))
        .toList();
  }

  /** At no coil count where the wire has no family at all. */
  private static <S extends State> WayOut of(
      Conflict conflict, Optional<Family<S>> springs, List<Limit<S>> limits) {
    WayOut best = new WayOut(conflict, Double.NaN, List.of());
    if (springs.isEmpty()) {
      return best;
    }
    Family<S> family = springs.get();
    for (double coils : counts(conflict)) {
      if (coils >= family.fewestCoils() && coils <= family.mostCoils()) {
        WayOut way = new WayOut(conflict, coils, failing(family.at(coils), limits));
        best = way.isNearerThan(best) ? way : best;
      }
    }
    return best;
  }

  private static <S extends State> Optional<Family<S>> family(
      Synthesis<S> kind, Problem problem, Conflict conflict) {
    for (Family<S> family : kind.families(problem, List.of(conflict.wire()))) {
      if (family.endForm().equals(conflict.endForm())) {
        return Optional.of(family);
      }
    }
    return Optional.empty();
  }

  /** Where a pair comes closest; else the bounds of all parts, and whole counts. */
  private static List<Double> counts(Conflict conflict) {
    List<Conflict.Part> parts = conflict.parts();
    if (parts.size() == 2) {
      Nearest nearest = Nearest.of(parts.get(0).coils(), parts.get(1).coils());
      return List.of(nearest.inFirst(), nearest.inSecond());
    }
    List<Double> counts = new ArrayList<>();
    for (Conflict.Part part : parts) {
      for (CoilSet.Interval interval : part.coils().intervals()) {
        counts.add(interval.from());
        counts.add(interval.to());
      }
    }
    for (int coils = 1; coils <= MOST_COILS_TRIED; coils++) {
      counts.add((double) coils);
    }
    return counts;
  }

  private static <S extends State> List<Miss> failing(S state, List<Limit<S>> limits) {
    List<Miss> failing = new ArrayList<>();
    for (Limit<S> limit : limits) {
      Finding finding = limit.judge(state);
      if (!(finding.margin() >= -AT_THE_BOUND)) {
        failing.add(new Miss(finding, limit.removable() && limit.name().removable()));
      }
    }
    return failing;
  }

  /** The shares by which limits would have to give way, added; infinite where one cannot [-]. */
  double shortfall() {
    double sum = Double.isNaN(coils) ? Double.POSITIVE_INFINITY : 0;
    for (Miss miss : failing) {
      sum += miss.removable() ? -miss.finding().margin() : Double.POSITIVE_INFINITY;
    }
    return sum;
  }

  /** Where neither can be enough, the one that misses less in all. */
  private boolean isNearerThan(WayOut other) {
    if (Double.isNaN(other.coils) || shortfall() < other.shortfall()) {
      return true;
    }
    return Double.isInfinite(shortfall())
        && Double.isInfinite(other.shortfall())
        && missed() < other.missed();
  }

  private double missed() {
    return failing.stream().mapToDouble(miss -> -miss.finding().margin()).sum();
  }

  /** "at 11 coils: stress at load 975 MPa, allowed 873 MPa". */
  String text(OutputUnits units) {
    if (Double.isNaN(coils)) {
      return "at no coil count would changing the limits be enough";
    }
    String at =
        (Double.isInfinite(shortfall())
                ? "at no coil count would changing the limits be enough; nearest at "
                : "at ")
            + Numbers.brief(coils, 2)
            + " coils: ";
    return failing.isEmpty()
        ? at + "only rounding stands in the way; try finer steps"
        : at + String.join("; ", failing.stream().map(each -> need(each, units)).toList());
  }

  private static String need(Miss miss, OutputUnits units) {
    Finding finding = miss.finding();
    Dimension dimension = finding.check().dimension();
    return judged(finding.check().limit())
        + " "
        + number(units, dimension, finding.value())
        + (finding.check().side() == Side.MAX ? ", allowed " : ", needed ")
        + number(units, dimension, finding.bound())
        + (miss.removable() ? "" : " (" + finding.check().definition() + ")");
  }

  /** The number that a limit judges, where its name alone would mislead. */
  private static String judged(LimitName name) {
    return switch (name) {
      case BORE -> "outside diameter in the bore";
      case ROD -> "inside diameter over the rod";
      case BUCKLING -> "deflection, against buckling,";
      default -> name.text();
    };
  }

  private static String number(OutputUnits units, Dimension dimension, double value) {
    return units.brief(dimension, value, dimension == Dimension.STRESS ? 0 : 2);
  }
}
