package coilwright.problem;

import java.util.Optional;

/**
 * One thing wrong with a problem file.
 *
 * @param line line in the file, from 1; 0 where no line applies
 * @param path the key's path, such as "loads[1].length"; empty where none applies
 * @param found what was found
 * @param remedy what is accepted, or what to change
 * @param nearest the nearest known word, where one is misspelt
 */
public record Fault(int line, String path, String found, String remedy, Optional<String> nearest) {

  /** The fault in one line: place, finding, remedy. */
  public String text() {
    String place = path.isEmpty() ? "file" : path;
    String at = line > 0 ? " (line " + line + ")" : "";
    String hint = nearest.map(word -> " (did you mean " + word + "?)").orElse("");
    return place + at + ": " + found + "; " + remedy + hint;
  }
}
