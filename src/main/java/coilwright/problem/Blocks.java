package coilwright.problem;

import coilwright.spring.Kind;
import java.util.Optional;

/**
 * The blocks of a file, each opened once, so that what is wrong with their keys is said once.
 *
 * @param root the file
 * @param purpose what the file is read for: one with a spring to check needs no load line
 * @param envelope the space, where given
 * @param make what may be made, where given
 * @param design the spring to check, where given
 * @param limits the limits, where given
 */
record Blocks(
    Section root,
    Purpose purpose,
    Optional<Section> envelope,
    Optional<Section> make,
    Optional<Section> design,
    Optional<Section> limits) {

  /**
   * Opens the blocks.
   *
   * @param root the file
   * @param purpose what it is read for
   * @return the blocks
   */
  static Blocks of(Section root, Purpose purpose) {
    return new Blocks(
        root,
        root.has(DesignKeys.DESIGN) ? Purpose.CHECK : purpose,
        root.read(EnvelopeKeys.ENVELOPE),
        root.read(MakeKeys.MAKE),
        root.read(DesignKeys.DESIGN),
        root.read(LimitKeys.LIMITS));
  }

  /** The kind of spring. */
  Kind kind() {
    return root.spot().kind();
  }

  /** How many faults there are so far. */
  long faults() {
    return root.spot().faults().count();
  }
}
