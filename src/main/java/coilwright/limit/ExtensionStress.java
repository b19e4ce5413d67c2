package coilwright.limit;

import coilwright.problem.StressLimit;
import coilwright.source.Citation;
import coilwright.source.Source;
import coilwright.spring.ExtensionState;
import coilwright.spring.Family;
import coilwright.spring.InitialTension;
import coilwright.spring.Method;
import coilwright.spring.StressCorrection;
import coilwright.unit.Dimension;
import java.util.Arrays;

/** The stress at one place of an extension spring against a share of tensile strength. */
final class ExtensionStress implements Limit<ExtensionState> {

  private static final Citation FILE = Citation.seen(Source.PROBLEM_FILE, "limits");
  private static final Citation BESIDE_THE_AXIS =
      Citation.seen(Source.FIRST_PRINCIPLES, "the formulas take the load to be on the axis");

  private final ExtensionPlace place;
  private final StressLimit limit;
  private final Method method;
  private final StressCorrection correction;
  private final boolean overtravel;
  private final Check check;
  private final Check ofHighTension;
  private final Check notAssessed;

  /**
   * A bound.
   *
   * @param place where
   * @param limit what the file says
   * @param method whose allowables apply where it says none
   * @param correction which factor corrects the stress of the body
   * @param overtravel whether there is an overtravel beyond the loads
   */
  ExtensionStress(
      ExtensionPlace place,
      StressLimit limit,
      Method method,
      StressCorrection correction,
      boolean overtravel) {
    this.place = place;
    this.limit = limit;
    this.method = method;
    this.correction = correction;
    this.overtravel = overtravel;
    this.check = check(definition() + (overtravel ? ", overtravel included" : ""));
    this.ofHighTension =
        check(
            check.definition() + "; initial tension above the preferred range: shares of the ends");
    this.notAssessed = check("not assessed: the load of a side loop is beside the axis");
  }

  private Check check(String definition) {
    return new Check(place.limit(), Side.MAX, Dimension.STRESS, definition);
  }

  private String definition() {
    return switch (place) {
      case BODY ->
          (place.corrected(method) ? "corrected, " + correction.author() : "uncorrected")
              + ", initial tension included";
      case HOOK_BENDING -> "bending and tension of the loop, corrected for its curvature";
      case HOOK_TORSION -> "torsion of the side bend, corrected for its curvature";
    };
  }

  @Override
  public Check check() {
    return check;
  }

  @Override
  public Finding judge(ExtensionState state) {
    if (!state.stressAssessed()) {
      return Finding.cannotFail(notAssessed, BESIDE_THE_AXIS);
    }
    return Finding.of(
        lowered() && highTension(state) ? ofHighTension : check,
        stress(state),
        share(state) * state.wire().tensileStrength(),
        limit.share().isPresent() ? FILE : place.citation(method));
  }

  private double share(ExtensionState state) {
    return limit
        .share()
        .orElseGet(
            () ->
                place.share(
                    method,
                    state.wire().grade().allowableClass(),
                    lowered() && highTension(state)));
  }

  /** Whether a high initial tension lowers the share. */
  private boolean lowered() {
    return place == ExtensionPlace.BODY && method == Method.HANDBOOK && limit.share().isEmpty();
  }

  private static boolean highTension(ExtensionState state) {
    return state.initialTension() > state.greatestPreferred(InitialTension.USUAL);
  }

  /**
   * {@inheritDoc}
   *
   * <p>Of a given force the stress turns at one index only. The share of the body jumps where the
   * initial tension leaves its range. Where the lengths are left open, the force at an overtravel
   * goes with them.
   */
  @Override
  public double[] turns(Family<ExtensionState> family) {
    AlongExtension along = new AlongExtension(family);
    if (!along.any().stressAssessed()) {
      return new double[0];
    }
    if (overtravel && along.curve().lengthsOpen()) {
      return along.turns(mean -> stress(family.at(along.curve().coilsAt(mean))));
    }
    double turn =
        place.corrected(method)
            ? along.coilsAtIndex(place.leastIndex(along.curve().hooks(), correction))
            : 0;
    double[] jumps = lowered() ? along.besideHighTension() : new double[0];
    double[] turns = Arrays.copyOf(jumps, jumps.length + 1);
    turns[jumps.length] = turn;
    return turns;
  }

  private double stress(ExtensionState state) {
    return place.stress(state, state.extremeForce(), place.corrected(method));
  }
}
