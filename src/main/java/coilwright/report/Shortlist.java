package coilwright.report;

import coilwright.material.Catalogue;
import coilwright.material.Wire;
import coilwright.material.WireGrade;
import coilwright.problem.Problem;
import coilwright.problem.UnitSystem;
import coilwright.search.Answer;
import coilwright.search.Candidate;
import coilwright.search.WireChoice;
import coilwright.spring.State;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/**
 * What a shortlist shows.
 *
 * @param sheet what is particular to the kind of spring
 * @param problem the problem, with the order in which the list stands
 * @param choice the wires it offers
 * @param answer what the search found
 * @param everyCount whether every feasible coil count is listed, or the best of each wire
 * @param ranked all candidates that may be listed, best first
 * @param most how many of them, or lines of text, are shown
 * @param catalogue knows which grades are equivalent
 * @param <S> the state of the kind of spring
 */
public record Shortlist<S extends State>(
    Sheet<S> sheet,
    Problem problem,
    WireChoice choice,
    Answer<S> answer,
    boolean everyCount,
    List<Candidate<S>> ranked,
    int most,
    Catalogue catalogue)
    implements Result {

  /** Copies the list. */
  public Shortlist {
    ranked = List.copyOf(ranked);
  }

  /** The candidates that JSON and CSV hold, best first. */
  List<Candidate<S>> shown() {
    return ranked.subList(0, Math.min(most, ranked.size()));
  }

  @Override
  public String text(UnitSystem units) {
    return new ShortlistText<>(this, OutputUnits.ofText(units)).text();
  }

  @Override
  public String json() {
    return Json.document(new ShortlistJson<>(this));
  }

  @Override
  public String csv(UnitSystem units) {
    return ShortlistCsv.of(this, OutputUnits.ofData(units));
  }

  @Override
  public List<String> remarks() {
    List<String> remarks = new ArrayList<>(Warnings.full(Warnings.of(this)));
    if (answer.feasible().isEmpty()) {
      remarks.add("no spring meets the problem; --format text says why");
    }
    return remarks;
  }

  /** The grades tried, in order. Told apart by their id: comparing whole grades is slow work. */
  List<WireGrade> grades() {
    Map<String, WireGrade> byId = new LinkedHashMap<>();
    for (Wire wire : choice.wires()) {
      byId.putIfAbsent(wire.grade().id(), wire.grade());
    }
    return List.copyOf(byId.values());
  }

  /** Ids of the grades tried, in order. */
  List<String> materials() {
    return grades().stream().map(WireGrade::id).toList();
  }
}
