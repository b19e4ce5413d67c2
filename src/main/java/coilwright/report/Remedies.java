package coilwright.report;

import coilwright.limit.Finding;
import coilwright.limit.Limit;
import coilwright.limit.Side;
import coilwright.problem.LimitName;
import coilwright.problem.Problem;
import coilwright.search.CompressionSearch;
import coilwright.search.Conflict;
import coilwright.search.Nearest;
import coilwright.spring.CompressionFamily;
import coilwright.spring.CompressionState;
import coilwright.unit.Dimension;
import java.util.ArrayList;
import java.util.List;

/** What would have to change for a wire without a candidate to have one. */
final class Remedies {

  private static final int MOST_TRIED = 100;

  /** A coil count at a bound fails it by no more than the accuracy of the count. */
  private static final double AT_THE_BOUND = 1e-6;

  private final CompressionFamily family;
  private final List<Limit<CompressionState>> limits;

  private Remedies(Problem problem, Conflict conflict) {
    this.family =
        CompressionSearch.families(problem, List.of(conflict.wire())).stream()
            .filter(one -> one.endForm().equals(conflict.endForm()))
            .findFirst()
            .orElseThrow();
    this.limits = CompressionSearch.limits(problem);
  }

  /** One line for each way out: a coil count, and every limit that would have to give way there. */
  static List<String> of(Problem problem, Conflict conflict) {
    Remedies remedies = new Remedies(problem, conflict);
    List<Conflict.Part> parts = conflict.parts();
    List<String> lines = new ArrayList<>();
    if (parts.size() == 1) {
      remedies.add(lines, remedies.closest(parts.get(0).limit()));
    } else if (parts.size() == 2) {
      Nearest nearest = Nearest.of(parts.get(0).coils(), parts.get(1).coils());
      remedies.add(lines, nearest.inFirst());
      remedies.add(lines, nearest.inSecond());
    }
    return lines;
  }

  /** A count at which a physical fact fails is no way out. */
  private void add(List<String> lines, double coils) {
    if (!(coils >= family.fewestCoils() && coils <= family.mostCoils())) {
      return;
    }
    List<Finding> failing = failing(coils);
    if (failing.stream().allMatch(finding -> finding.check().limit().removable())) {
      List<String> needs = failing.stream().map(Remedies::need).toList();
      lines.add("at " + Numbers.brief(coils, 2) + " coils: " + String.join("; ", needs));
    }
  }

  private List<Finding> failing(double coils) {
    CompressionState state = family.at(coils);
    return limits.stream()
        .map(limit -> limit.judge(state))
        .filter(finding -> finding.margin() < -AT_THE_BOUND)
        .toList();
  }

  /** "stress at load 975 MPa, allowed 873 MPa". */
  private static String need(Finding finding) {
    Dimension dimension = finding.check().dimension();
    return judged(finding.check().limit())
        + " "
        + number(dimension, finding.value())
        + (finding.check().side() == Side.MAX ? ", allowed " : ", needed ")
        + number(dimension, finding.bound());
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

  private static String number(Dimension dimension, double value) {
    String unit = OutputUnits.METRIC.symbol(dimension);
    int decimals = dimension == Dimension.STRESS ? 0 : 2;
    String number = Numbers.brief(OutputUnits.METRIC.convert(dimension, value), decimals);
    return unit.isEmpty() ? number : number + " " + unit;
  }

  /** Where a limit that fails everywhere fails least, among whole coil counts. */
  private double closest(LimitName name) {
    double best = Double.NaN;
    double margin = Double.NEGATIVE_INFINITY;
    for (double coils = 1; coils <= Math.min(MOST_TRIED, family.mostCoils()); coils++) {
      for (Finding finding : failing(coils)) {
        if (finding.check().limit() == name && finding.margin() > margin) {
          margin = finding.margin();
          best = coils;
        }
      }
    }
    return best;
  }
}
