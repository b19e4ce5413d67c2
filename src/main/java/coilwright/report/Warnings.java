package coilwright.report;

import coilwright.problem.Problem;
import coilwright.rank.Ranked;
import coilwright.source.Evidence;
import coilwright.spring.State;
import java.util.ArrayList;
import java.util.List;

/** What a reader of a result should know before relying on it. */
final class Warnings {

  private Warnings() {}

  /** The warnings of a shortlist. */
  static <S extends State> List<Warning> of(Shortlist<S> shortlist) {
    return of(shortlist, Ranked.of(shortlist.shown()));
  }

  /** The warnings of a shortlist that shows some springs. */
  static <S extends State> List<Warning> of(Shortlist<S> shortlist, List<Ranked<S>> shown) {
    List<Warning> warnings = new ArrayList<>();
    shortlist.choice().fromMemory().forEach((id, sizes) -> warnings.add(leftOut(id, sizes)));
    warnings.addAll(shared(shortlist.sheet(), shortlist.problem(), shown, true));
    return warnings;
  }

  /** The warnings of one checked spring. */
  static <S extends State> List<Warning> of(Checked<S> checked) {
    return shared(
        checked.sheet(),
        checked.problem(),
        Ranked.of(checked.check().spring().stream().toList()),
        false);
  }

  /** Each in a line, with the ids it concerns. */
  static List<String> full(List<Warning> warnings) {
    return warnings.stream().map(Warning::full).toList();
  }

  private static Warning leftOut(String id, int sizes) {
    String many =
        sizes == 1
            ? " size rests on data from memory and was"
            : " sizes rest on data from memory and were";
    return new Warning(
        id + ": " + sizes + many + " left out; name the grade under make.materials to try them",
        List.of(),
        List.of());
  }

  private static <S extends State> List<Warning> shared(
      Sheet<S> sheet, Problem problem, List<Ranked<S>> springs, boolean ranked) {
    List<Sheet.Note<S>> notes = new ArrayList<>();
    notes.add(
        new Sheet.Note<>(
            "strength, moduli or size from memory, to be confirmed against the standard",
            state -> state.wire().evidence() == Evidence.MEMORY));
    notes.add(
        new Sheet.Note<>(
            "density from memory, on which " + sheet.restsOnDensity(),
            state -> state.wire().grade().densityEvidence() == Evidence.MEMORY));
    notes.addAll(sheet.notes(problem));
    List<Warning> warnings = new ArrayList<>();
    notes.forEach(note -> warn(warnings, note, springs, ranked));
    if (!springs.isEmpty()) {
      sheet.generalNotes().forEach(what -> warnings.add(new Warning(what, List.of(), List.of())));
    }
    return warnings;
  }

  /** One warning for all the springs it concerns. */
  private static <S extends State> void warn(
      List<Warning> warnings, Sheet.Note<S> note, List<Ranked<S>> springs, boolean ranked) {
    List<String> ids = new ArrayList<>();
    List<Integer> rows = new ArrayList<>();
    for (Ranked<S> spring : springs) {
      if (note.concerns().test(spring.candidate().state())) {
        ids.add(Quantities.id(spring.candidate()));
        rows.add(spring.rank());
      }
    }
    if (!ids.isEmpty()) {
      warnings.add(new Warning(note.what(), ids, ranked ? rows : List.of()));
    }
  }
}
