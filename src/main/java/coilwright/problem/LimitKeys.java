package coilwright.problem;

import coilwright.spring.Method;
import coilwright.spring.StressCorrection;
import coilwright.unit.Dimension;
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
      limit("limits.active_coils", "3 to 60", "{min: 3, max: 60}", "coils that deflect");

  static final ProblemKey<Setting<Double>> ACTIVE_COILS_MIN =
      bound("limits.active_coils.min", Values.number(Range.ABOVE_ZERO), "3", "least number", "3");

  static final ProblemKey<Setting<Double>> ACTIVE_COILS_MAX =
      bound(
          "limits.active_coils.max",
          Values.number(Range.ABOVE_ZERO),
          "60",
          "greatest number",
          "60");

  static final ProblemKey<Setting<Section>> PITCH_ANGLE =
      limit(
          "limits.pitch_angle", "up to 12 deg", "{max: 12 deg}", "slope of the coil without load");

  static final ProblemKey<Setting<Double>> PITCH_ANGLE_MAX =
      bound(
          "limits.pitch_angle.max",
          Values.quantity(Dimension.ANGLE, BELOW_UPRIGHT),
          "12 deg",
          "greatest slope",
          "12 deg");

  static final ProblemKey<Setting<Double>> CLASH_ALLOWANCE =
      bound(
          "limits.clash_allowance",
          Values.quantity(Dimension.SHARE, Range.FROM_ZERO),
          "15 %; under en-13906 the sum of gaps",
          "travel kept before solid, of the deflection at the greatest load",
          "15 %");

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
          "bergstraesser");

  static final ProblemKey<Setting<Section>> STRESS_AT_LOAD =
      limit(
          "limits.stress_at_load",
          "the value of the stress basis for the material",
          "{max: 45 %}",
          "share of tensile strength at the loads");

  static final ProblemKey<Setting<Double>> STRESS_AT_LOAD_MAX =
      bound(
          "limits.stress_at_load.max",
          Values.shareOfStrength(),
          "the value of the stress basis for the material",
          "greatest share",
          "45 %");

  static final ProblemKey<Setting<Section>> STRESS_AT_SOLID =
      limit(
          "limits.stress_at_solid",
          "the value of the stress basis for the material",
          "{max: 45 %}",
          "likewise with the coils pressed together");

  static final ProblemKey<Setting<Double>> STRESS_AT_SOLID_MAX =
      bound(
          "limits.stress_at_solid.max",
          Values.shareOfStrength(),
          "the value of the stress basis for the material",
          "greatest share",
          "45 %");

  static final ProblemKey<BucklingRule> BUCKLING =
      ProblemKey.of(
          "limits.buckling",
          new WordReader<>(
              List.of(BucklingRule.AT_LOAD, BucklingRule.AT_SOLID, BucklingRule.NONE),
              BucklingRule::id),
          "at-load, only reported where a bore or rod guides the spring",
          "where sideways stability is judged",
          "at-load");

  static final ProblemKey<Setting<Section>> SURGE_FREQUENCY =
      limit("limits.surge_frequency", "not judged", "{min: 200 Hz}", "first natural frequency");

  static final ProblemKey<Setting<Double>> SURGE_FREQUENCY_MIN =
      bound(
          "limits.surge_frequency.min",
          Values.quantity(Dimension.FREQUENCY, Range.ABOVE_ZERO),
          "not judged",
          "least frequency",
          "200 Hz");

  /** All of them. */
  static final List<ProblemKey<?>> ROWS =
      List.of(
          LIMITS,
          SPRING_INDEX,
          SPRING_INDEX_MIN,
          SPRING_INDEX_MAX,
          ACTIVE_COILS,
          ACTIVE_COILS_MIN,
          ACTIVE_COILS_MAX,
          PITCH_ANGLE,
          PITCH_ANGLE_MAX,
          CLASH_ALLOWANCE,
          STRESS_BASIS,
          STRESS_CORRECTION,
          STRESS_AT_LOAD,
          STRESS_AT_LOAD_MAX,
          STRESS_AT_SOLID,
          STRESS_AT_SOLID_MAX,
          BUCKLING,
          SURGE_FREQUENCY,
          SURGE_FREQUENCY_MIN);

  private LimitKeys() {}

  private static ProblemKey<Setting<Section>> limit(
      String path, String omitted, String example, String help) {
    return ProblemKey.of(path, new SwitchReader<>(new SectionReader(path)), omitted, help, example);
  }

  private static <T> ProblemKey<Setting<T>> bound(
      String path, ValueReader<T> reader, String omitted, String help, String example) {
    return ProblemKey.of(path, new SwitchReader<>(reader), omitted, help, example);
  }
}
