package coilwright.problem;

import coilwright.spring.Kind;
import java.util.List;
import java.util.stream.Stream;

/**
 * Keys of one block that stand instead of one another.
 *
 * @param keys the keys, two or more
 * @param needed whether one of them at least must be given
 * @param exclusive whether one of them at most may be given
 */
record Alternatives(List<ProblemKey<?>> keys, boolean needed, boolean exclusive) {

  /** All of them. */
  static final List<Alternatives> ALL =
      Stream.concat(
              Stream.of(
                  new Alternatives(List.of(LoadKeys.LENGTH, LoadKeys.FORCE), true, false),
                  new Alternatives(
                      List.of(LoadKeys.LENGTH_INSIDE_HOOKS, LoadKeys.FORCE), true, false),
                  new Alternatives(
                      List.of(TorqueKeys.ANGLE, TorqueKeys.TORQUE, TorqueKeys.FORCE), true, false),
                  new Alternatives(List.of(TorqueKeys.TORQUE, TorqueKeys.FORCE), false, true),
                  new Alternatives(List.of(TorqueKeys.TORQUE, TorqueKeys.ARM), false, true),
                  new Alternatives(List.of(MakeKeys.WIRE_SERIES, MakeKeys.WIRE_SIZES), false, true),
                  new Alternatives(List.copyOf(DesignKeys.DIAMETERS), true, true),
                  new Alternatives(List.copyOf(DesignKeys.COILS), true, true)),
              MaterialKeys.TAKEN.stream()
                  .map(key -> new Alternatives(List.of(MaterialKeys.LIKE, key), true, false)))
          .toList();

  /** The path of the block. */
  String parent() {
    return keys.get(0).parent();
  }

  /**
   * Whether a kind of spring has them.
   *
   * @param kind the kind
   */
  boolean standsFor(Kind kind) {
    return keys.stream().allMatch(key -> key.kinds().contains(kind));
  }

  /** Their form. */
  Form.Choice form() {
    return new Form.Choice(keys.stream().<String>map(ProblemKey::name).toList(), needed, exclusive);
  }
}
