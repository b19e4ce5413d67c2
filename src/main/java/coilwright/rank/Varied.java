package coilwright.rank;

import coilwright.spring.State;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/**
 * A list whose first lines show more than one material: none stands in more than half of the first
 * ten while lines of others are left. The first ten are in the order of their ranks, and so is
 * every line behind them; lines of one material never change places.
 *
 * @param <S> the state of the kind of spring
 * @param lines all lines, in the order in which they are shown
 * @param heldBack those that stand behind the first ten though one of these is ranked behind them
 */
public record Varied<S extends State>(List<Line<S>> lines, List<Line<S>> heldBack) {

  /** How many lines the rule is about. */
  public static final int FIRST = 10;

  /** How many of them a material may have while others fit. */
  public static final int MOST = FIRST / 2;

  /** Copies the lists. */
  public Varied {
    lines = List.copyOf(lines);
    heldBack = List.copyOf(heldBack);
  }

  /**
   * Arranges lines.
   *
   * @param ranked the lines, by rank
   * @param <S> the state of the kind of spring
   * @return the same lines, each once
   */
  public static <S extends State> Varied<S> of(List<Line<S>> ranked) {
    List<Line<S>> first = new ArrayList<>();
    List<Line<S>> later = new ArrayList<>();
    Map<String, Integer> shares = new HashMap<>();
    for (Line<S> line : ranked) {
      boolean fits = first.size() < FIRST && shares.getOrDefault(line.material(), 0) < MOST;
      if (fits) {
        shares.merge(line.material(), 1, Integer::sum);
      }
      (fits ? first : later).add(line);
    }
    fill(first, later);
    List<Line<S>> lines = new ArrayList<>(first);
    lines.addAll(later);
    return new Varied<>(lines, overtaken(first, later));
  }

  /** Where the other materials run out, the best of what was held back takes what is free. */
  private static <S extends State> void fill(List<Line<S>> first, List<Line<S>> later) {
    int free = Math.min(FIRST - first.size(), later.size());
    if (free > 0) {
      List<Line<S>> best = later.subList(0, free);
      first.addAll(best);
      best.clear();
      first.sort(Comparator.comparingInt(line -> line.lead().rank()));
    }
  }

  private static <S extends State> List<Line<S>> overtaken(
      List<Line<S>> first, List<Line<S>> later) {
    int last = first.isEmpty() ? 0 : first.get(first.size() - 1).lead().rank();
    List<Line<S>> overtaken = new ArrayList<>();
    for (Line<S> line : later) {
      if (line.lead().rank() < last) {
        overtaken.add(line);
      }
    }
    return overtaken;
  }
}
