package coilwright.problem;

import coilwright.material.Catalogue;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;

/** The grade ids that a problem file may name. */
final class MaterialIds {

  /** The word for every grade there is. */
  static final String ALL = "all";

  private static final List<String> LATER =
      List.of(
          "music-wire",
          "hard-drawn",
          "oil-tempered",
          "chrome-vanadium",
          "chrome-silicon",
          "stainless-302",
          "stainless-316",
          "stainless-17-7ph",
          "phosphor-bronze",
          "beryllium-copper",
          "monel-400",
          "monel-k500",
          "inconel-600",
          "inconel-x750",
          "en-10270-1-sl",
          "en-10270-1-sm",
          "en-10270-1-dm",
          "en-10270-1-sh",
          "en-10270-1-dh",
          "en-10270-2-fdc",
          "en-10270-2-fdcrv",
          "en-10270-2-fdsicr",
          "en-10270-2-vdsicr",
          "en-10270-3-1.4310-ns",
          "en-10270-3-1.4310-hs",
          "en-10270-3-1.4401",
          "en-10270-3-1.4568");

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
    if (LATER.contains(id)) {
      spot.fault(ShownText.of(id) + ", " + Later.WORDS, accepted());
    } else {
      spot.fault(ShownText.of(id) + ", an unknown grade", accepted(), spot.nearest(id, known));
    }
  }

  /**
   * Reports an id that need not or cannot be excluded.
   *
   * @param id as typed
   * @param spot its place
   */
  void checkExcluded(String id, Spot spot) {
    if (LATER.contains(id) && !known.contains(id)) {
      spot.fault(
          ShownText.of(id) + ", not in the catalogue yet",
          "must be left out; without data it is never tried");
    } else {
      check(id, spot);
    }
  }

  private String accepted() {
    List<String> first = known.stream().limit(SHOWN).toList();
    return "must be one of " + String.join(", ", first) + (known.size() > SHOWN ? ", ..." : "");
  }
}
