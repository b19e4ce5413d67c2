package coilwright.problem;

import coilwright.spring.HookType;
import coilwright.spring.Kind;
import java.util.List;

/** The keys about the hooks of an extension spring, to be made or to be judged. */
final class HookKeys {

  private static final Range RADIUS = Range.within(0.1, 1);

  private static final ValueReader<HookType> TYPE =
      new WordReader<>(List.of(HookType.values()), HookType::id);

  static final ProblemKey<List<HookType>> TYPES =
      of("make.hooks", Values.list(TYPE), "full-loop", "how the ends are formed", "[full-loop]");

  static final ProblemKey<HookType> DESIGNED =
      of("design.hooks", TYPE, "", "how the ends are formed", "full-loop");

  static final ProblemKey<HookLength> LENGTH =
      of(
          "make.hook_length",
          new HookLengthReader(true),
          "natural",
          "how far each reaches beyond the body; free: whatever meets the loads at the middle of the"
              + " preferred initial tension",
          "free");

  static final ProblemKey<HookLength> DESIGNED_LENGTH =
      of(
          "design.hook_length",
          new HookLengthReader(false),
          "natural",
          "how far each reaches beyond the body",
          "natural");

  static final ProblemKey<Double> BEND_RADIUS = bendRadius("make");
  static final ProblemKey<Double> SIDE_RADIUS = sideRadius("make");
  static final ProblemKey<Double> ACTIVE_COILS = activeCoils("make");

  static final ProblemKey<LoopPlanes> PLANES =
      of(
          "make.loop_planes",
          new WordReader<>(List.of(LoopPlanes.values()), LoopPlanes::id),
          "any",
          "how the two hooks lie to each other, seen along the axis",
          "any");

  /** Of the spring to make. */
  static final List<ProblemKey<?>> MAKE_ROWS =
      List.of(TYPES, LENGTH, BEND_RADIUS, SIDE_RADIUS, PLANES, ACTIVE_COILS);

  /** Of the spring to judge. */
  static final List<ProblemKey<?>> DESIGN_ROWS =
      List.of(
          DESIGNED,
          DESIGNED_LENGTH,
          bendRadius("design"),
          sideRadius("design"),
          activeCoils("design"));

  private HookKeys() {}

  private static ProblemKey<Double> bendRadius(String block) {
    return of(
        block + ".hook_bend_radius",
        Values.number(RADIUS),
        "0.5",
        "mean radius of the loop, as a multiple of the mean diameter",
        "0.5");
  }

  private static ProblemKey<Double> sideRadius(String block) {
    return of(
        block + ".hook_side_radius",
        Values.number(RADIUS),
        "0.25",
        "mean radius of the bend from the body into the loop, likewise",
        "0.25");
  }

  private static ProblemKey<Double> activeCoils(String block) {
    return of(
        block + ".hook_active_coils",
        Values.number(Range.within(0, 2)),
        "the usual share of the hook's type",
        "active coils that each hook adds",
        "0.2");
  }

  private static <T> ProblemKey<T> of(
      String path, ValueReader<T> reader, String omitted, String help, String... examples) {
    return ProblemKey.of(path, reader, omitted, help, examples).only(Kind.EXTENSION);
  }
}
