package coilwright.problem;

import coilwright.spring.Kind;
import coilwright.spring.Method;
import java.util.Optional;
import java.util.OptionalDouble;

/** Reads the limits, merged bound by bound with the defaults. */
final class LimitsReader {

  private static final OptionalDouble NONE = OptionalDouble.empty();

  private LimitsReader() {}

  /**
   * Reads the limits.
   *
   * @param given their block
   * @param kind the kind of spring
   * @return the limits; the defaults where the file has none
   */
  static DesignLimits read(Optional<Section> given, Kind kind) {
    DesignLimits usual = DesignLimits.defaults(kind);
    return given.map(section -> limits(section, usual, kind)).orElse(usual);
  }

  private static DesignLimits limits(Section section, DesignLimits usual, Kind kind) {
    Method method = section.read(LimitKeys.STRESS_BASIS).orElse(usual.method());
    boolean standard = method == Method.EN_13906;
    boolean pressed = kind == Kind.COMPRESSION;
    Optional<Setting<Double>> clash = section.read(LimitKeys.CLASH_ALLOWANCE);
    return new DesignLimits(
        new BandReader(
                LimitKeys.SPRING_INDEX, LimitKeys.SPRING_INDEX_MIN, LimitKeys.SPRING_INDEX_MAX)
            .read(section, usual.springIndex()),
        new BandReader(
                LimitKeys.ACTIVE_COILS, LimitKeys.ACTIVE_COILS_MIN, LimitKeys.ACTIVE_COILS_MAX)
            .read(section, usual.activeCoils()),
        bound(section, LimitKeys.PITCH_ANGLE, LimitKeys.PITCH_ANGLE_MAX, usual.maxPitchAngle()),
        BandReader.bound(clash, standard ? NONE : usual.clashAllowance()),
        pressed && standard && clash.map(setting -> setting.value().isPresent()).orElse(true),
        method,
        section.read(LimitKeys.STRESS_CORRECTION).orElse(usual.stressCorrection()),
        pressed ? LimitKeys.STRESS_AT_LOAD.read(Optional.of(section)) : usual.stressAtLoad(),
        pressed ? LimitKeys.STRESS_AT_SOLID.read(Optional.of(section)) : usual.stressAtSolid(),
        section.read(LimitKeys.BUCKLING).orElse(usual.buckling()),
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
}
