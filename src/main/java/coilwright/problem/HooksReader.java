package coilwright.problem;

import coilwright.spring.HookType;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/** Reads the hooks of extension springs to be made. */
final class HooksReader {

  private static final double BEND_RADIUS = 0.5;
  private static final double SIDE_RADIUS = 0.25;

  private HooksReader() {}

  /**
   * Reads the hooks.
   *
   * @param make the block of what may be made; the defaults where it is left out
   * @return the hooks
   */
  static HooksAsked read(Optional<Section> make) {
    List<HookType> types =
        make.flatMap(section -> section.read(HookKeys.TYPES)).orElse(List.of(HookType.FULL_LOOP));
    HookLength length =
        make.flatMap(section -> section.read(HookKeys.LENGTH)).orElse(HookLength.natural());
    LoopPlanes planes =
        make.flatMap(section -> section.read(HookKeys.PLANES)).orElse(LoopPlanes.ANY);
    return read(make, types, length, planes);
  }

  /**
   * The hooks with what their two blocks of keys have in common.
   *
   * @param block where the radii and active coils stand
   * @param types the types
   * @param length how far each reaches beyond the body
   * @param planes how the two lie to each other
   * @return the hooks
   */
  static HooksAsked read(
      Optional<Section> block, List<HookType> types, HookLength length, LoopPlanes planes) {
    return new HooksAsked(
        types,
        length,
        block.flatMap(section -> section.read(HookKeys.BEND_RADIUS)).orElse(BEND_RADIUS),
        block.flatMap(section -> section.read(HookKeys.SIDE_RADIUS)).orElse(SIDE_RADIUS),
        planes,
        block.map(section -> section.number(HookKeys.ACTIVE_COILS)).orElse(OptionalDouble.empty()));
  }
}
