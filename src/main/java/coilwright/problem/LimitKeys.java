package coilwright.problem;

import coilwright.spring.Kind;
import coilwright.spring.Method;
import coilwright.spring.StressCorrection;
import coilwright.unit.Dimension;
import java.util.ArrayList;
import java.util.List;

/** The keys about the limits a spring must hold. */
final class LimitKeys {

  private static final Range BELOW_UPRIGHT = new Range(0, false, Math.PI / 2, false);

  static final ProblemKey<Section> LIMITS =
      ProblemKey.section(
          "limits",
          "the defaults",
          "merged bound by bound with the defaults; none switches a limit or bound off");

  static final ProblemKey<Setting<Section>> SPRING_INDEX =
      limit(
          "limits.spring_index",
          "5 to 12",
          "{min: 5, max: 12}",
          "mean diameter over wire diameter");

  static final ProblemKey<Setting<Double>> SPRING_INDEX_MIN =
      bound("limits.spring_index.min", Values.number(Range.ABOVE_ZERO), "5", "least index", "5");

  static final ProblemKey<Setting<Double>> SPRING_INDEX_MAX =
      bound("limits.spring_index.max", Values.number(Range.above(1)), "12", "greatest index", "12");

  static final ProblemKey<Setting<Section>> ACTIVE_COILS =
      limit("limits.active_coils", "3 to 60", "{min: 3, max: 60}", "coils that deflect")
          .only(Kind.COMPRESSION);

  static final ProblemKey<Setting<Section>> BODY_COILS =
      limit("limits.active_coils", "3 or more", "{min: 3, max: 60}", "coils of the body")
          .only(Kind.EXTENSION);

  static final ProblemKey<Setting<Section>> BODY_COILS_OF_TORSION =
      limit("limits.active_coils", "3 to 60", "{min: 3, max: 60}", "coils of the body")
          .only(Kind.TORSION);

  static final ProblemKey<Setting<Double>> ACTIVE_COILS_MIN =
      bound("limits.active_coils.min", Values.number(Range.ABOVE_ZERO), "3", "least number", "3");

  static final ProblemKey<Setting<Double>> ACTIVE_COILS_MAX =
      bound(
              "limits.active_coils.max",
              Values.number(Range.ABOVE_ZERO),
              "60",
              "greatest number",
              "60")
          .only(Kind.COMPRESSION, Kind.TORSION);

  static final ProblemKey<Setting<Double>> BODY_COILS_MAX =
      bound(
              "limits.active_coils.max",
              Values.number(Range.ABOVE_ZERO),
              "no limit",
              "greatest number",
              "60")
          .only(Kind.EXTENSION);

  static final ProblemKey<Setting<Section>> PITCH_ANGLE =
      limit("limits.pitch_angle", "up to 12 deg", "{max: 12 deg}", "slope of the coil without load")
          .only(Kind.COMPRESSION);

  static final ProblemKey<Setting<Double>> PITCH_ANGLE_MAX =
      bound(
              "limits.pitch_angle.max",
              Values.quantity(Dimension.ANGLE, BELOW_UPRIGHT),
              "12 deg",
              "greatest slope",
              "12 deg")
          .only(Kind.COMPRESSION);

  static final ProblemKey<Setting<Double>> CLASH_ALLOWANCE =
      bound(
              "limits.clash_allowance",
              Values.quantity(Dimension.SHARE, Range.FROM_ZERO),
              "15 %; under en-13906 the sum of gaps",
              "travel kept before solid, of the deflection at the greatest load",
              "15 %")
          .only(Kind.COMPRESSION);

  static final ProblemKey<Method> STRESS_BASIS =
      ProblemKey.of(
          "limits.stress_basis",
          new WordReader<>(List.of(Method.values()), Method::id),
          "handbook",
          "whose allowables and formulas",
          "handbook");

  static final ProblemKey<StressCorrection> STRESS_CORRECTION =
      ProblemKey.of(
              "limits.stress_correction",
              new WordReader<>(List.of(StressCorrection.values()), StressCorrection::id),
              "bergstraesser",
              "the factor for curvature and direct shear",
              "bergstraesser")
          .only(Kind.COMPRESSION, Kind.EXTENSION);

  static final StressKeys STRESS_AT_LOAD =
      StressKeys.of(
          "stress_at_load", "45 %", "share of tensile strength at the loads", Kind.COMPRESSION);

  static final StressKeys STRESS_AT_SOLID =
      StressKeys.of(
          "stress_at_solid", "45 %", "likewise with the coils pressed together", Kind.COMPRESSION);

  static final ProblemKey<Boolean> INITIAL_TENSION =
      ProblemKey.of(
              "limits.initial_tension",
              new WordReader<>(List.of(true, false), preferred -> preferred ? "preferred" : "any"),
              "preferred",
              "inside the published range for the index, or any that is not negative",
              "preferred")
          .only(Kind.EXTENSION);

  static final StressKeys STRESS_IN_BODY =
      StressKeys.of(
          "stress_in_body",
          "45 %",
          "share of tensile strength in the body at the greatest load",
          Kind.EXTENSION);

  static final StressKeys HOOK_BENDING_STRESS =
      StressKeys.of(
          "hook_bending_stress", "75 %", "likewise at the crown of the hooks", Kind.EXTENSION);

  static final StressKeys HOOK_TORSION_STRESS =
      StressKeys.of(
          "hook_torsion_stress",
          "40 %",
          "likewise at the bend from the body into the hooks",
          Kind.EXTENSION);

  static final StressKeys BENDING_STRESS_AT_LOAD =
      StressKeys.of(
          "bending_stress_at_load",
          "80 %",
          "share of tensile strength at the greatest torque",
          Kind.TORSION);

  static final ProblemKey<Double> RATE_CONSTANT =
      ProblemKey.of(
              "limits.rate_constant",
              Values.number(Range.within(10, 12.5)),
              "10.8; under en-13906 10.186, without friction",
              "c in the rate per turn, E d^4/(c D n)",
              "10.8")
          .only(Kind.TORSION);

  static final ProblemKey<BucklingRule> BUCKLING =
      ProblemKey.of(
              "limits.buckling",
              new WordReader<>(
                  List.of(BucklingRule.AT_LOAD, BucklingRule.AT_SOLID, BucklingRule.NONE),
                  BucklingRule::id),
              "at-load, only reported where a bore or rod guides the spring",
              "where sideways stability is judged",
              "at-load")
          .only(Kind.COMPRESSION);

  static final ProblemKey<Setting<Section>> SURGE_FREQUENCY =
      limit("limits.surge_frequency", "not judged", "{min: 200 Hz}", "first natural frequency")
          .only(Kind.COMPRESSION, Kind.EXTENSION);

  static final ProblemKey<Setting<Double>> SURGE_FREQUENCY_MIN =
      bound(
              "limits.surge_frequency.min",
              Values.quantity(Dimension.FREQUENCY, Range.ABOVE_ZERO),
              "not judged",
              "least frequency",
              "200 Hz")
          .only(Kind.COMPRESSION, Kind.EXTENSION);

  /** All of them. */
  static final List<ProblemKey<?>> ROWS = rows();

  private LimitKeys() {}

  private static List<ProblemKey<?>> rows() {
    List<ProblemKey<?>> rows = new ArrayList<>();
    rows.addAll(List.of(LIMITS, SPRING_INDEX, SPRING_INDEX_MIN, SPRING_INDEX_MAX));
    rows.addAll(List.of(ACTIVE_COILS, BODY_COILS, BODY_COILS_OF_TORSION));
    rows.addAll(List.of(ACTIVE_COILS_MIN, ACTIVE_COILS_MAX, BODY_COILS_MAX));
    rows.addAll(List.of(PITCH_ANGLE, PITCH_ANGLE_MAX, CLASH_ALLOWANCE));
    rows.addAll(List.of(STRESS_BASIS, STRESS_CORRECTION));
    rows.addAll(STRESS_AT_LOAD.rows());
    rows.addAll(STRESS_AT_SOLID.rows());
    rows.add(INITIAL_TENSION);
    rows.addAll(STRESS_IN_BODY.rows());
    rows.addAll(HOOK_BENDING_STRESS.rows());
    rows.addAll(HOOK_TORSION_STRESS.rows());
    rows.addAll(BENDING_STRESS_AT_LOAD.rows());
    rows.addAll(List.of(RATE_CONSTANT, BUCKLING, SURGE_FREQUENCY, SURGE_FREQUENCY_MIN));
    return List.copyOf(rows);
  }

  private static ProblemKey<Setting<Section>> limit(
      String path, String omitted, String example, String help) {
    return ProblemKey.of(path, new SwitchReader<>(new SectionReader(path)), omitted, help, example);
  }

  private static <T> ProblemKey<Setting<T>> bound(
      String path, ValueReader<T> reader, String omitted, String help, String example) {
    return ProblemKey.of(path, new SwitchReader<>(reader), omitted, help, example);
  }
}
