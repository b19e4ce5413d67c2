package coilwright.problem;

import coilwright.spring.Kind;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;

/** Reports the keys of a block that are not known there. */
final class UnknownKeys {

  /** Shorter keys than this say too little to point at another place [signs]. */
  private static final int SHORTEST = 3;

  private UnknownKeys() {}

  /**
   * Reports them.
   *
   * @param mapping the block
   * @param spot its place
   * @return the known keys that misspelt ones were probably meant to be
   */
  static Set<String> report(Node.Mapping mapping, Spot spot) {
    String parent = spot.pattern();
    List<String> known = KeyTable.names(spot.kind(), parent);
    Set<String> meant = new HashSet<>();
    for (Node.Entry entry : mapping.entries()) {
      if (!known.contains(entry.key())) {
        report(entry.key(), parent, known, spot.key(entry.mark(), entry.key()))
            .ifPresent(meant::add);
      }
    }
    return meant;
  }

  private static Optional<String> report(String key, String parent, List<String> known, Spot spot) {
    List<Kind> others = KeyTable.kindsOf(parent, key);
    if (!others.isEmpty()) {
      String kinds = String.join(" and ", others.stream().map(Kind::id).toList());
      spot.fault(
          "a key of " + kinds + " springs",
          "must be left out of " + Starter.article(spot.kind()) + spot.kind().id() + " file");
      return Optional.empty();
    }
    Optional<String> nearest = spot.nearest(key, known);
    spot.fault(
        "unknown key",
        "accepted here: " + String.join(", ", known),
        nearest.isPresent() ? nearest : elsewhere(key, spot.kind()));
    return nearest;
  }

  private static Optional<String> elsewhere(String key, Kind kind) {
    return (key.length() < SHORTEST ? Optional.<String>empty() : KeyTable.pathOf(kind, key))
        .map(path -> path.equals(key) ? key + " at the top of the file" : path);
  }
}
