package coilwright.problem;

import coilwright.spring.Method;
import java.util.Optional;
import java.util.OptionalDouble;

/** Reads the limits, merged bound by bound with the defaults. */
final class LimitsReader {

  private static final DesignLimits USUAL = DesignLimits.DEFAULTS;
  private static final OptionalDouble NONE = OptionalDouble.empty();

  private LimitsReader() {}

  /**
   * Reads the limits.
   *
   * @param root the file
   * @return the limits; the defaults where the file has none
   */
  static DesignLimits read(Section root) {
    return root.read(LimitKeys.LIMITS).map(LimitsReader::limits).orElse(USUAL);
  }

  private static DesignLimits limits(Section section) {
    Method method = section.read(LimitKeys.STRESS_BASIS).orElse(USUAL.method());
    boolean standard = method == Method.EN_13906;
    Optional<Setting<Double>> clash = section.read(LimitKeys.CLASH_ALLOWANCE);
    return new DesignLimits(
        new BandReader(
                LimitKeys.SPRING_INDEX, LimitKeys.SPRING_INDEX_MIN, LimitKeys.SPRING_INDEX_MAX)
            .read(section, USUAL.springIndex()),
        new BandReader(
                LimitKeys.ACTIVE_COILS, LimitKeys.ACTIVE_COILS_MIN, LimitKeys.ACTIVE_COILS_MAX)
            .read(section, USUAL.activeCoils()),
        bound(section, LimitKeys.PITCH_ANGLE, LimitKeys.PITCH_ANGLE_MAX, USUAL.maxPitchAngle()),
        BandReader.bound(clash, standard ? NONE : USUAL.clashAllowance()),
        standard && clash.map(setting -> setting.value().isPresent()).orElse(true),
        method,
        section.read(LimitKeys.STRESS_CORRECTION).orElse(USUAL.stressCorrection()),
        stress(section, LimitKeys.STRESS_AT_LOAD, LimitKeys.STRESS_AT_LOAD_MAX),
        stress(section, LimitKeys.STRESS_AT_SOLID, LimitKeys.STRESS_AT_SOLID_MAX),
        section.read(LimitKeys.BUCKLING).orElse(USUAL.buckling()),
        bound(section, LimitKeys.SURGE_FREQUENCY, LimitKeys.SURGE_FREQUENCY_MIN, NONE));
  }

  private static OptionalDouble bound(
      Section section,
      ProblemKey<Setting<Section>> key,
      ProblemKey<Setting<Double>> boundKey,
      OptionalDouble usual) {
    return section
        .read(key)
        .map(
            setting ->
                setting
                    .value()
                    .map(inner -> BandReader.bound(inner.read(boundKey), usual))
                    .orElse(NONE))
        .orElse(usual);
  }

  private static StressLimit stress(
      Section section, ProblemKey<Setting<Section>> key, ProblemKey<Setting<Double>> maxKey) {
    Optional<Setting<Section>> setting = section.read(key);
    if (setting.isEmpty()) {
      return new StressLimit(true, NONE);
    }
    if (setting.get().value().isEmpty()) {
      return new StressLimit(false, NONE);
    }
    Optional<Setting<Double>> max = setting.get().value().get().read(maxKey);
    boolean judged = max.isEmpty() || max.get().value().isPresent();
    return new StressLimit(judged, BandReader.bound(max, NONE));
  }
}
