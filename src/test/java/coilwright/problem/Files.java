package coilwright.problem;

import coilwright.material.Catalogue;
import java.nio.charset.StandardCharsets;
import java.util.List;

/** Problem files for tests, and what comes of reading them. */
final class Files {

  /** Six lines that make a valid problem. */
  static final String LOADS =
      """
      spring: compression
      loads:
        - length: 32 mm
          force: 18 N
        - length: 22 mm
          force: 45 N
      """;

  /** Ten lines that make a valid problem to check; the block of the spring is last. */
  static final String DESIGN =
      """
      spring: compression
      loads: [{length: 22 mm, force: 45 N}]
      design:
        material: music-wire
        wire_diameter: 1.4 mm
        mean_diameter: 12.2 mm
        active_coils: 8
        free_length: 38.7 mm
        ends: squared-ground
      """;

  /** Four lines that make a valid problem of an extension spring. */
  static final String EXTENSION =
      """
      spring: extension
      loads:
        - {length: 50 mm, force: 18 N}
        - {length: 65 mm, force: 45 N}
      """;

  /** Four lines that make a valid problem of a torsion spring. */
  static final String TORSION =
      """
      spring: torsion
      loads:
        - {angle: 30 deg, torque: 150 N*mm}
        - {angle: 120 deg, torque: 600 N*mm}
      """;

  static final Catalogue CATALOGUE = Catalogue.load();

  private Files() {}

  static Reading shortlist(String text) {
    return read(text, Purpose.SHORTLIST);
  }

  static Reading check(String text) {
    return read(text, Purpose.CHECK);
  }

  static Reading read(String text, Purpose purpose) {
    return ProblemReader.read(text.getBytes(StandardCharsets.UTF_8), purpose, CATALOGUE);
  }

  static Problem problem(String text) {
    return good(shortlist(text));
  }

  static Problem checked(String text) {
    return good(check(text));
  }

  /** The messages of a file's faults. */
  static List<String> faults(Reading reading) {
    if (reading.problem().isPresent() == !reading.faults().isEmpty()) {
      throw new AssertionError("a problem or faults, never both, never neither");
    }
    return reading.faults().stream().map(Fault::text).toList();
  }

  private static Problem good(Reading reading) {
    return reading.problem().orElseThrow(() -> new AssertionError(faults(reading)));
  }
}
