package coilwright.report;

import coilwright.material.Catalogue;
import coilwright.material.GradeSource;
import coilwright.material.Wire;
import coilwright.material.WireGrade;
import coilwright.material.WireSeries;
import coilwright.material.WireSize;
import coilwright.problem.UnitSystem;
import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;

/** Wire grades of the catalogue. */
public final class Grades implements Result {

  private final Catalogue catalogue;
  private final List<String> ids;
  private final boolean everySize;

  /**
   * Grades to show.
   *
   * @param catalogue the catalogue
   * @param ids the grades wanted, in order
   * @param everySize whether text shows every size of the usual series, and not a spread of them
   */
  public Grades(Catalogue catalogue, List<String> ids, boolean everySize) {
    this.catalogue = catalogue;
    this.ids = List.copyOf(ids);
    this.everySize = everySize;
  }

  /** What they are, the sources, and their properties over the sizes wanted. */
  @Override
  public String text(UnitSystem units) {
    OutputUnits shown = OutputUnits.ofText(units);
    StringBuilder text = new StringBuilder();
    for (String id : ids) {
      WireGrade grade = catalogue.grade(id);
      text.append(text.isEmpty() ? "" : "\n")
          .append(GradeText.of(grade, wires(grade), everySize, shown));
    }
    return text.toString();
  }

  /** The same, over every size of their usual series. */
  @Override
  public String json() {
    return Json.document(
        json -> {
          json.count("format", ShortlistJson.FORMAT);
          json.array("materials", this::materials);
        });
  }

  private List<Wire> wires(WireGrade grade) {
    List<Wire> wires = new ArrayList<>();
    for (WireSeries series : grade.usualSeries()) {
      for (WireSize size : catalogue.sizes(series)) {
        if (grade.diameters().contains(size.diameter())) {
          wires.add(grade.drawnTo(size));
        }
      }
    }
    return wires;
  }

  private void materials(Json json) throws IOException {
    for (String id : ids) {
      json.braces(body -> material(body, catalogue.grade(id)));
    }
  }

  private void material(Json json, WireGrade grade) throws IOException {
    json.fields(GradeFields.GRADE, grade);
    json.strings("usual_series", series(grade));
    json.array("wires", list -> wires(list, grade));
    json.array("sources", list -> sources(list, grade));
  }

  private void wires(Json json, WireGrade grade) throws IOException {
    for (Wire wire : wires(grade)) {
      json.braces(
          body -> {
            body.fields(GradeFields.SIZE, wire.size());
            body.fields(GradeFields.WIRE, wire);
          });
    }
  }

  private static void sources(Json json, WireGrade grade) throws IOException {
    for (GradeSource source : grade.sources()) {
      json.braces(body -> body.fields(GradeFields.SOURCE, source));
    }
  }

  /**
   * A row of CSV.
   *
   * @param grade the grade
   * @param wire one of its wires; empty in the only row of a grade that is stocked in no series
   */
  private record Row(WireGrade grade, Optional<Wire> wire) {}

  /** One row a wire, with what its grade is in every row. */
  @Override
  public String csv(UnitSystem units) {
    List<Row> rows = new ArrayList<>();
    for (String id : ids) {
      WireGrade grade = catalogue.grade(id);
      List<Wire> wires = wires(grade);
      wires.forEach(wire -> rows.add(new Row(grade, Optional.of(wire))));
      if (wires.isEmpty()) {
        rows.add(new Row(grade, Optional.empty()));
      }
    }
    Function<Row, Optional<WireGrade>> grade = row -> Optional.of(row.grade());
    return new Columns<Row>(OutputUnits.ofData(units))
        .addPart("", GradeFields.GRADE, grade)
        .addPart("", List.of(GradeFields.list("usual_series", Grades::series)), grade)
        .addPart("", GradeFields.SIZE, row -> row.wire().map(Wire::size))
        .addPart("", GradeFields.WIRE, Row::wire)
        .addPart("", List.of(GradeFields.list("sources", Grades::sources)), grade)
        .table(rows);
  }

  /** Ids of the series that a grade is usually stocked in. */
  static List<String> series(WireGrade grade) {
    return grade.usualSeries().stream().map(WireSeries::id).toList();
  }

  /** Where its data come from, each kind in a line. */
  static List<String> sources(WireGrade grade) {
    List<String> sources = new ArrayList<>();
    for (GradeSource source : grade.sources()) {
      sources.add(source.what() + ": " + source.text() + " (" + source.evidence().word() + ")");
    }
    return sources;
  }
}
