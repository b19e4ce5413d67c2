package coilwright.rank;

import coilwright.search.Candidate;
import coilwright.spring.State;
import java.util.ArrayList;
import java.util.List;

/**
 * A candidate with its place in the whole order.
 *
 * @param rank its place, from 1
 * @param candidate the candidate
 * @param <S> the state of the kind of spring
 */
public record Ranked<S extends State>(int rank, Candidate<S> candidate) {

  /**
   * Numbers candidates.
   *
   * @param candidates best first
   * @param <S> the state of the kind of spring
   * @return the same, each with its place
   */
  public static <S extends State> List<Ranked<S>> of(List<Candidate<S>> candidates) {
    List<Ranked<S>> ranked = new ArrayList<>(candidates.size());
    for (Candidate<S> candidate : candidates) {
      ranked.add(new Ranked<>(ranked.size() + 1, candidate));
    }
    return ranked;
  }
}
