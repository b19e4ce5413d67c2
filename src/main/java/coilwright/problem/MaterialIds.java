package coilwright.problem;

import coilwright.material.Catalogue;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;

/** The grade ids that a problem file may name. */
final class MaterialIds {

  /** The word for every grade there is. */
  static final String ALL = "all";

  /** How many ids a message lists; enough for every grade of the catalogue. */
  private static final int SHOWN = 40;

  private final Set<String> known;

  /**
   * The ids of a catalogue.
   *
   * @param catalogue the catalogue
   */
  MaterialIds(Catalogue catalogue) {
    this.known = new LinkedHashSet<>(catalogue.gradeIds());
  }

  /**
   * Makes an own grade's id known.
   *
   * @param id the id
   * @return false where it is known already
   */
  boolean add(String id) {
    return known.add(id);
  }

  /**
   * Whether an id is known.
   *
   * @param id the id
   * @return true if it is
   */
  boolean knows(String id) {
    return known.contains(id);
  }

  /**
   * Reports an id that is not known.
   *
   * @param id as typed
   * @param spot its place
   */
  void check(String id, Spot spot) {
    if (known.contains(id)) {
      return;
    }
    spot.fault(ShownText.of(id) + ", an unknown grade", accepted(), spot.nearest(id, known));
  }

  private String accepted() {
    List<String> first = known.stream().limit(SHOWN).toList();
    return "must be one of " + String.join(", ", first) + (known.size() > SHOWN ? ", ..." : "");
  }
}
