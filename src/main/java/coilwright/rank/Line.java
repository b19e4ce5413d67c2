package coilwright.rank;

import coilwright.spring.State;
import java.util.List;

/**
 * One line of a list: a spring, and those that are alike.
 *
 * @param lead the best of them
 * @param also the others, best first
 * @param <S> the state of the kind of spring
 */
public record Line<S extends State>(Ranked<S> lead, List<Ranked<S>> also) {

  /** Copies the list. */
  public Line {
    also = List.copyOf(also);
  }

  /** Id of the grade that leads. */
  String material() {
    return lead.candidate().state().wire().grade().id();
  }
}
