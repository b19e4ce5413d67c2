package coilwright.rank;

import coilwright.limit.Finding;
import coilwright.problem.RankBy;
import coilwright.search.Answer;
import coilwright.search.Candidate;
import coilwright.spring.State;
import java.util.Comparator;
import java.util.List;
import java.util.function.ToDoubleFunction;

/** Orders of candidates, best first. Ties go by material, wire diameter, ends and coil count. */
public final class Order {

  private Order() {}

  /**
   * The order that a word asks for.
   *
   * @param by the word
   * @param <S> the state of the kind of spring
   * @return the comparator, best first
   */
  public static <S extends State> Comparator<Candidate<S>> by(RankBy by) {
    ToDoubleFunction<Candidate<S>> merit =
        switch (by) {
          case MASS -> candidate -> candidate.state().mass();
          case MARGIN -> candidate -> -candidate.leastMargin().orElse(0);
          case COST -> candidate -> Cost.of(candidate.state()).total();
          case ROBUST -> candidate -> -candidate.limiting().map(Finding::margin).orElse(0.0);
        };
    return Comparator.comparingDouble(merit)
        .thenComparing(candidate -> candidate.state().wire().grade().id())
        .thenComparingDouble(candidate -> candidate.state().wire().diameter())
        .thenComparing(candidate -> candidate.state().endForm())
        .thenComparingDouble(candidate -> candidate.state().coils());
  }

  /**
   * The best spring of each wire, or every spring, in order.
   *
   * @param answer what the search found
   * @param by the order
   * @param everyCount whether every feasible coil count is wanted
   * @param <S> the state of the kind of spring
   * @return the candidates, best first
   */
  public static <S extends State> List<Candidate<S>> ranked(
      Answer<S> answer, RankBy by, boolean everyCount) {
    Comparator<Candidate<S>> order = by(by);
    return answer.feasible().stream()
        .flatMap(wire -> everyCount ? wire.stream() : wire.stream().min(order).stream())
        .sorted(order)
        .toList();
  }
}
