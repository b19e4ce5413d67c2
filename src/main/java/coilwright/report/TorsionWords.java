package coilwright.report;

import coilwright.limit.BendingBasis;
import coilwright.problem.LegsAsked;
import coilwright.problem.Problem;
import coilwright.problem.Tolerance;
import coilwright.problem.TorqueAsked;
import coilwright.problem.TorqueLine;
import coilwright.problem.TorsionAsked;
import coilwright.problem.TorsionDesign;
import coilwright.unit.Dimension;
import java.util.ArrayList;
import java.util.List;

/** What of a problem only torsion springs have, in words. */
final class TorsionWords {

  private final Understood words;
  private final Problem problem;
  private final TorsionAsked asked;

  TorsionWords(Understood words) {
    this.words = words;
    this.problem = words.problem();
    this.asked = problem.torsion().orElseThrow();
  }

  /** Adds the loads and what they come to. */
  void loads() {
    List<String> loads = asked.loads().stream().map(this::load).toList();
    String stroke =
        asked.facts().stroke().isPresent()
            ? "; stroke " + angle(asked.facts().stroke().getAsDouble())
            : "";
    words.row("loads", String.join("; ", loads) + stroke + words.shared());
    words.row(
        "loading", asked.closing() ? "closing: the loads wind it up" : "opening: they unwind it");
    words.row(words.each(), asked.line().map(this::line).orElseGet(this::assumedFreeAngle));
  }

  private String load(TorqueAsked load) {
    List<String> parts = new ArrayList<>();
    load.point().torque().ifPresent(torque -> parts.add(brief(Dimension.TORQUE, torque, 2)));
    load.tolerance().map(this::tolerance).ifPresent(parts::add);
    load.point().angle().ifPresent(at -> parts.add("at " + angle(at)));
    if (load.point().torque().isEmpty()) {
      parts.add("(torque found)");
    }
    return String.join(" ", parts);
  }

  private String tolerance(Tolerance tolerance) {
    return "(+"
        + words.units().number(Dimension.TORQUE, tolerance.plus(), 2)
        + " -"
        + brief(Dimension.TORQUE, tolerance.minus(), 2)
        + " accepted, not judged)";
  }

  private String line(TorqueLine line) {
    return "rate "
        + brief(Dimension.ANGULAR_RATE, line.rate(), 4)
        + (line.freeAngle().isPresent()
            ? ", no torque at " + angle(line.freeAngle().getAsDouble())
            : ", no reference for angles")
        + ", from "
        + line.rule();
  }

  /** Where the facts fix no line, the spring to check sets it. */
  private String assumedFreeAngle() {
    boolean set =
        asked.loads().stream()
            .map(TorqueAsked::point)
            .anyMatch(point -> point.torque().isPresent() && point.angle().isPresent());
    return set
        ? "the spring's own, set so that its torque is met at its angle (assumed)"
        : "the spring's own, angles counted from free (assumed)";
  }

  /** Adds the legs. */
  void legs() {
    LegsAsked legs = asked.legs();
    words.row(
        "legs",
        (legs.first() == 0 && legs.second() == 0
                ? "not counted"
                : words.length(legs.first()) + " and " + words.length(legs.second()))
            + (legs.angle().isPresent()
                ? ", " + angle(legs.angle().getAsDouble()) + " apart at load " + legs.atLoad()
                : ", at any angle"));
  }

  /** Adds the angle asked between the legs of a spring to check. */
  void legAngle() {
    LegsAsked legs = ((TorsionDesign) problem.design().orElseThrow()).legs();
    legs.angle()
        .ifPresent(at -> words.row("legs", angle(at) + " apart asked at load " + legs.atLoad()));
  }

  /** Adds the limits. */
  void limits() {
    LimitWords shares = new LimitWords(words);
    words.row(
        "limits",
        "index "
            + LimitWords.band(problem.limits().springIndex())
            + ", body coils "
            + LimitWords.band(problem.limits().activeCoils()));
    BendingBasis basis = BendingBasis.of(problem.limits().method());
    words.row(
        "stress",
        "bending at the greatest torque "
            + shares.share(
                asked.bendingStress(),
                grade ->
                    basis
                        .allowable(asked.bendingStress(), grade.allowableClass(), asked.closing())
                        .share())
            + "; "
            + basis.definition());
    words.row(
        "rate",
        "E d^4/("
            + Numbers.brief(asked.rateConstant(), 4)
            + " D n) per turn, n with (l1 + l2)/(3 pi D) coils for the legs");
  }

  private String angle(double value) {
    return brief(Dimension.ANGLE, value, 2);
  }

  private String brief(Dimension dimension, double value, int decimals) {
    return words.units().brief(dimension, value, decimals);
  }
}
