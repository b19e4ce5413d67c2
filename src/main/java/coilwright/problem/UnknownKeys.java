package coilwright.problem;

import java.util.List;
import java.util.Optional;

/** Reports the keys of a block that are not known there. */
final class UnknownKeys {

  private UnknownKeys() {}

  /**
   * Reports them.
   *
   * @param mapping the block
   * @param spot its place
   */
  static void report(Node.Mapping mapping, Spot spot) {
    String parent = spot.pattern();
    List<String> known = KeyTable.names(parent);
    for (Node.Entry entry : mapping.entries()) {
      if (!known.contains(entry.key())) {
        report(entry.key(), parent, known, spot.key(entry.mark(), entry.key()));
      }
    }
  }

  private static void report(String key, String parent, List<String> known, Spot spot) {
    if (Later.has(parent.isEmpty() ? key : parent + "." + key)) {
      spot.fault(Later.WORDS, "must be left out");
      return;
    }
    Optional<String> nearest = spot.nearest(key, known);
    spot.fault(
        "unknown key",
        "accepted here: " + String.join(", ", known),
        nearest.isPresent() ? nearest : KeyTable.pathOf(key));
  }
}
