package coilwright.problem;

import coilwright.unit.Spelling;
import java.util.Collection;
import java.util.Optional;

/**
 * The place of a value: its path, where it stands in the file, and where faults about it go.
 *
 * @param mark where its key stands, or the value itself in a list
 * @param path such as "loads[1].length"; empty for the file as a whole
 * @param faults the collector
 */
record Spot(Mark mark, String path, Faults faults) {

  /**
   * The place of one of its keys.
   *
   * @param at where the key stands
   * @param key the key
   * @return the place
   */
  Spot key(Mark at, String key) {
    String name = ShownText.of(key);
    return new Spot(at, path.isEmpty() ? name : path + "." + name, faults);
  }

  /**
   * The place of one of its list items.
   *
   * @param at where the item stands
   * @param index from 0
   * @return the place
   */
  Spot item(Mark at, int index) {
    return new Spot(at, path + "[" + index + "]", faults);
  }

  /** The path with its indices left out, as the table of keys has it: "loads[].length". */
  String pattern() {
    return path.replaceAll("\\[[0-9]+\\]", "[]");
  }

  /**
   * Reports a fault here.
   *
   * @param found what was found
   * @param remedy what is accepted
   */
  void fault(String found, String remedy) {
    fault(found, remedy, Optional.empty());
  }

  /**
   * Reports a fault here that may be a misspelling.
   *
   * @param found what was found
   * @param remedy what is accepted
   * @param nearest the nearest known word
   */
  void fault(String found, String remedy, Optional<String> nearest) {
    faults.add(mark, new Fault(mark.line(), path, found, remedy, nearest));
  }

  /**
   * The nearest known word, unless there are too many faults to look for it.
   *
   * @param word as found
   * @param known the words accepted
   * @return the nearest, or empty
   */
  Optional<String> nearest(String word, Collection<String> known) {
    return faults.beyondHints() ? Optional.empty() : Spelling.nearest(word, known);
  }
}
