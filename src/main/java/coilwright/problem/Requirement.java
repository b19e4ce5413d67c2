package coilwright.problem;

import coilwright.spring.LoadLine;
import coilwright.spring.LoadPoint;
import java.util.List;

/**
 * What one spring must do: the load line that the facts fix, and the loads on it.
 *
 * @param line rate and free length of one spring
 * @param rule which facts fixed the line, in words: "two loads at lengths"
 * @param loads the loads of one spring in file order, each with its length and the force asked
 *     there
 */
public record Requirement(LoadLine line, String rule, List<LoadPoint> loads) {

  /** Copies the list. */
  public Requirement {
    loads = List.copyOf(loads);
  }
}
