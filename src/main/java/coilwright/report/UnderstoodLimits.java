package coilwright.report;

import coilwright.limit.Allowable;
import coilwright.limit.StressBasis;
import coilwright.material.WireGrade;
import coilwright.problem.Band;
import coilwright.problem.DesignLimits;
import coilwright.problem.Problem;
import coilwright.problem.StressLimit;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** The limits of a problem in words. */
final class UnderstoodLimits {

  private final Problem problem;
  private final DesignLimits limits;
  private final StressBasis basis;
  private final List<WireGrade> grades;

  UnderstoodLimits(Problem problem, List<WireGrade> grades) {
    this.problem = problem;
    this.limits = problem.limits();
    this.basis = StressBasis.of(limits.method(), problem.setRemoved());
    this.grades = grades;
  }

  void addTo(TextTable table) {
    table.row("limits", proportions());
    table.row("stress", stress());
    table.row("buckling", buckling());
    limits
        .minSurgeFrequency()
        .ifPresent(least -> table.row("surge", "from " + Numbers.brief(least, 1) + " Hz"));
  }

  private String proportions() {
    List<String> words = new ArrayList<>();
    words.add("index " + band(limits.springIndex()));
    words.add("active coils " + band(limits.activeCoils()));
    words.add(
        limits.maxPitchAngle().isPresent()
            ? "pitch angle up to "
                + Numbers.brief(StrictMath.toDegrees(limits.maxPitchAngle().getAsDouble()), 2)
                + " deg"
            : "pitch angle any");
    words.add("clash allowance " + clash());
    return String.join(", ", words);
  }

  private String clash() {
    if (limits.clashAllowance().isEmpty()) {
      return limits.gapSum() ? "the sum of gaps of EN 13906-1" : "none";
    }
    String share = percent(limits.clashAllowance().getAsDouble());
    return limits.gapSum() ? share + " and the sum of gaps of EN 13906-1" : share;
  }

  private static String band(Band band) {
    if (band.min().isEmpty() && band.max().isEmpty()) {
      return "any";
    }
    String min = band.min().isPresent() ? Numbers.brief(band.min().getAsDouble(), 4) : "";
    String max = band.max().isPresent() ? Numbers.brief(band.max().getAsDouble(), 4) : "";
    if (max.isEmpty()) {
      return "from " + min;
    }
    return min.isEmpty() ? "up to " + max : min + " to " + max;
  }

  private String stress() {
    String load = share(limits.stressAtLoad(), Allowable::atLoad);
    String solid = share(limits.stressAtSolid(), Allowable::atSolid);
    return (load.equals(solid)
            ? "at load and at solid " + load
            : "at load " + load + "; at solid " + solid)
        + "; "
        + meant();
  }

  private String meant() {
    return switch (basis) {
      case HANDBOOK -> "corrected by " + limits.stressCorrection().author();
      case HANDBOOK_SET_REMOVED -> "set removed, on the stress times 1 + 0.5/C";
      case EN_13906 -> "EN 13906-1, on the uncorrected stress";
    };
  }

  /** How the bound of a grade is chosen. */
  private interface Choice {
    Allowable of(StressLimit limit, WireGrade grade, StressBasis basis);
  }

  /** The share of each grade, grades with the same one together. */
  private String share(StressLimit limit, Choice choice) {
    if (!limit.judged()) {
      return "not judged";
    }
    if (limit.share().isPresent()) {
      return percent(limit.share().getAsDouble()) + " of tensile strength";
    }
    if (grades.isEmpty()) {
      return "the share of tensile strength that the basis gives";
    }
    Map<Double, List<String>> byShare = new LinkedHashMap<>();
    for (WireGrade grade : grades) {
      byShare
          .computeIfAbsent(choice.of(limit, grade, basis).share(), share -> new ArrayList<>())
          .add(grade.id());
    }
    List<String> words = new ArrayList<>();
    byShare.forEach(
        (share, ids) ->
            words.add(
                percent(share) + (byShare.size() > 1 ? " (" + String.join(", ", ids) + ")" : "")));
    return String.join(", ", words) + " of tensile strength";
  }

  private static String percent(double share) {
    return Numbers.brief(100 * share, 3) + " %";
  }

  private String buckling() {
    return switch (limits.buckling()) {
      case AT_LOAD -> "judged at the most compressed load";
      case AT_SOLID -> "judged at solid";
      case NONE -> "not judged";
      case AT_LOAD_UNLESS_GUIDED ->
          problem.envelope().guides()
              ? "reported, not judged: a bore or rod guides the spring (assumed)"
              : "judged at the most compressed load (assumed)";
    };
  }
}
