package coilwright.rank;

import coilwright.limit.Finding;
import coilwright.problem.RankBy;
import coilwright.search.Answer;
import coilwright.search.Candidate;
import coilwright.spring.State;
import java.util.ArrayList;
import java.util.Collections;
import java.util.Comparator;
import java.util.List;
import java.util.function.ToDoubleFunction;

/**
 * Orders of candidates, best first. Springs whose stresses are not assessed stand behind all
 * others. Ties go by material, wire diameter, ends and coil count.
 */
public final class Order {

  /**
   * Springs of one wire whose masses differ by no more than this weigh alike, where mass hardly
   * varies along its counts: rounding a diameter moves a mass by little less [-].
   */
  private static final double ALIKE = 0.01;

  /**
   * Stress margins no farther apart than this are the same: rounding a diameter moves a torque by
   * little less [-].
   */
  private static final double SAME = 0.001;

  private Order() {}

  /**
   * The order that a word asks for.
   *
   * @param by the word
   * @param <S> the state of the kind of spring
   * @return the comparator, best first
   */
  public static <S extends State> Comparator<Candidate<S>> by(RankBy by) {
    ToDoubleFunction<Candidate<S>> merit = merit(by);
    Comparator<Candidate<S>> known =
        Comparator.comparing(candidate -> !candidate.state().stressAssessed());
    return known
        .thenComparingDouble(merit)
        .thenComparing(candidate -> candidate.state().wire().grade().id())
        .thenComparingDouble(candidate -> candidate.state().wire().diameter())
        .thenComparing(candidate -> candidate.state().endForm())
        .thenComparingDouble(candidate -> candidate.state().coils());
  }

  /** What is to be least. */
  private static <S extends State> ToDoubleFunction<Candidate<S>> merit(RankBy by) {
    return switch (by) {
      case MASS -> candidate -> candidate.state().mass();
      case MARGIN -> candidate -> -candidate.leastMargin().orElse(0);
      case COST -> candidate -> Cost.of(candidate.state()).total();
      case ROBUST -> candidate -> -candidate.limiting().map(Finding::margin).orElse(0.0);
    };
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
    List<Candidate<S>> ranked = new ArrayList<>();
    for (List<Candidate<S>> wire : answer.feasible()) {
      if (everyCount) {
        ranked.addAll(wire);
      } else {
        ranked.add(best(wire, by, order));
      }
    }
    ranked.sort(order);
    return ranked;
  }

  /**
   * The best spring of one wire. Where mass hardly varies along its counts, those that weigh or
   * cost alike but for rounding are told apart by their stress margin, and where that is the same
   * at all counts, by the margin of the limiting check.
   */
  private static <S extends State> Candidate<S> best(
      List<Candidate<S>> wire, RankBy by, Comparator<Candidate<S>> order) {
    Candidate<S> best = Collections.min(wire, order);
    boolean byMass = by == RankBy.MASS || by == RankBy.COST;
    if (!byMass || !best.state().massHardlyVaries()) {
      return best;
    }
    double most = best.state().mass() * (1 + ALIKE);
    List<Candidate<S>> alike = new ArrayList<>(wire);
    alike.removeIf(candidate -> candidate.state().mass() > most);
    Candidate<S> strongest = Collections.min(alike, by(RankBy.MARGIN));
    double margin = strongest.leastMargin().orElse(0);
    alike.removeIf(candidate -> candidate.leastMargin().orElse(0) < margin - SAME);
    return Collections.min(alike, by(RankBy.ROBUST));
  }
}
