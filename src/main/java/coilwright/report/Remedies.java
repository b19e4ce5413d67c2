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
import java.util.Optional;

/** What would have to change for a wire without a candidate to have one. */
final class Remedies {

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

  /**
   * One line for each way out: what the failing limit would have to allow, and at how many coils.
   */
  static List<String> of(Problem problem, Conflict conflict) {
    Remedies remedies = new Remedies(problem, conflict);
    List<Conflict.Part> parts = conflict.parts();
    List<String> lines = new ArrayList<>();
    if (parts.size() == 1) {
      remedies.add(lines, parts.get(0).limit(), remedies.closest(parts.get(0).limit()));
    } else if (parts.size() == 2) {
      Nearest nearest = Nearest.of(parts.get(0).coils(), parts.get(1).coils());
      remedies.add(lines, parts.get(1).limit(), nearest.inFirst());
      remedies.add(lines, parts.get(0).limit(), nearest.inSecond());
    }
    return lines;
  }

  private void add(List<String> lines, LimitName name, double coils) {
    if (coils >= family.fewestCoils() && coils <= family.mostCoils()) {
      worst(name, coils).map(finding -> line(finding, coils)).ifPresent(lines::add);
    }
  }

  /** The finding of a name that fails most at a coil count. */
  private Optional<Finding> worst(LimitName name, double coils) {
    CompressionState state = family.at(coils);
    return limits.stream()
        .filter(limit -> limit.name() == name)
        .map(limit -> limit.judge(state))
        .filter(finding -> !finding.holds())
        .min((a, b) -> Double.compare(a.margin(), b.margin()));
  }

  /** Where a limit that fails everywhere fails least, among whole coil counts. */
  private double closest(LimitName name) {
    double best = Double.NaN;
    double margin = Double.NEGATIVE_INFINITY;
    for (double coils = 1; coils <= Math.min(100, family.mostCoils()); coils++) {
      Optional<Finding> finding = worst(name, coils);
      if (finding.isPresent() && finding.get().margin() > margin) {
        margin = finding.get().margin();
        best = coils;
      }
    }
    return best;
  }

  private static String line(Finding finding, double coils) {
    Dimension dimension = finding.check().dimension();
    String unit = OutputUnits.METRIC.symbol(dimension);
    boolean most = finding.check().side() == Side.MAX;
    return "it would do if "
        + finding.check().limit().text()
        + (most ? " allowed " : " needed only ")
        + number(dimension, finding.value())
        + (unit.isEmpty() ? "" : " " + unit)
        + (most ? " (now at most " : " (now at least ")
        + number(dimension, finding.bound())
        + (unit.isEmpty() ? "" : " " + unit)
        + "), at "
        + Numbers.brief(coils, 2)
        + " coils";
  }

  private static String number(Dimension dimension, double value) {
    return Numbers.brief(OutputUnits.METRIC.convert(dimension, value), 2);
  }
}
