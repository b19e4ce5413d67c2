package coilwright.material;

import java.util.LinkedHashMap;
import java.util.Map;

/**
 * The comment lines that head a catalogue file, each written {@code # key: words}. A key may be
 * repeated: its words are then one text.
 *
 * @param file name of the file
 * @param lines how many lines the header has
 * @param entries what stands under each key
 */
record TableHeader(String file, int lines, Map<String, String> entries) {

  /** Keeps its own copy. */
  TableHeader {
    entries = Map.copyOf(entries);
  }

  /**
   * Reads the leading comment lines of a file.
   *
   * @param file name of the file, for messages
   * @param text the whole file
   * @return its header
   * @throws IllegalStateException if a comment line has no key
   */
  static TableHeader of(String file, String text) {
    Map<String, String> entries = new LinkedHashMap<>();
    int count = 0;
    for (String line : text.lines().takeWhile(each -> each.startsWith("#")).toList()) {
      count++;
      int colon = line.indexOf(": ");
      if (colon < 0) {
        throw TableFault.at(file, count, "found \"" + line + "\", accepted: # key: words");
      }
      String key = line.substring(1, colon).strip();
      entries.merge(key, line.substring(colon + 2).strip(), (first, more) -> first + " " + more);
    }
    return new TableHeader(file, count, entries);
  }

  /**
   * What stands under a key.
   *
   * @param key such as "rule"
   * @return its words
   * @throws IllegalStateException if the header lacks the key
   */
  String entry(String key) {
    String words = entries.get(key);
    if (words == null || words.isEmpty()) {
      throw TableFault.at(file, 1, "the header has no line \"# " + key + ": ...\"");
    }
    return words;
  }

  /**
   * The unit of a column, from the line {@code # units: diameter in, strength ksi}.
   *
   * @param column name of the column
   * @return the symbol of its unit
   * @throws IllegalStateException if the line does not name the column
   */
  String unitOf(String column) {
    for (String entry : entry("units").split(",")) {
      String pair = entry.strip();
      if (pair.startsWith(column) && pair.startsWith(" ", column.length())) {
        return pair.substring(column.length() + 1);
      }
    }
    throw TableFault.at(file, 1, "the line \"# units\" gives none for column " + column);
  }
}
