package coilwright.report;

import coilwright.limit.Allowable;
import coilwright.limit.StressBasis;
import coilwright.problem.CompressionDesign;
import coilwright.problem.DesignLimits;
import coilwright.problem.Problem;
import coilwright.spring.Seating;
import java.util.ArrayList;
import java.util.List;

/** How a compression spring is held, and its limits, in words. */
final class CompressionLimitWords {

  private final Understood words;
  private final Problem problem;
  private final DesignLimits limits;
  private final StressBasis basis;

  CompressionLimitWords(Understood words) {
    this.words = words;
    this.problem = words.problem();
    this.limits = problem.limits();
    this.basis = StressBasis.of(limits.method(), problem.setRemoved());
  }

  /** Adds them all. */
  void add() {
    words.row("seats", problem.seats().map(Seating::id).orElseGet(this::assumedSeats));
    words.row("limits", proportions());
    words.row("stress", stress());
    words.row("buckling", buckling());
    new LimitWords(words).surge();
  }

  private String assumedSeats() {
    return problem
        .design()
        .map(CompressionDesign.class::cast)
        .map(CompressionDesign::ends)
        .map(ends -> Seating.usualFor(ends).id() + " (assumed)")
        .orElse("fixed-fixed for squared-ground ends, else pinned-pinned (assumed)");
  }

  private String proportions() {
    List<String> parts = new ArrayList<>();
    parts.add("index " + LimitWords.band(limits.springIndex()));
    parts.add("active coils " + LimitWords.band(limits.activeCoils()));
    parts.add(
        limits.maxPitchAngle().isPresent()
            ? "pitch angle up to "
                + Numbers.brief(StrictMath.toDegrees(limits.maxPitchAngle().getAsDouble()), 2)
                + " deg"
            : "pitch angle any");
    parts.add("clash allowance " + clash());
    return String.join(", ", parts);
  }

  private String clash() {
    if (limits.clashAllowance().isEmpty()) {
      return limits.gapSum() ? "the sum of gaps of EN 13906-1" : "none";
    }
    String share = LimitWords.percent(limits.clashAllowance().getAsDouble());
    return limits.gapSum() ? share + " and the sum of gaps of EN 13906-1" : share;
  }

  private String stress() {
    LimitWords shares = new LimitWords(words);
    String load =
        shares.share(
            limits.stressAtLoad(),
            grade -> Allowable.atLoad(limits.stressAtLoad(), grade, basis).share());
    String solid =
        shares.share(
            limits.stressAtSolid(),
            grade -> Allowable.atSolid(limits.stressAtSolid(), grade, basis).share());
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
