package coilwright.report;

import coilwright.material.Catalogue;
import coilwright.material.GradeSource;
import coilwright.material.Wire;
import coilwright.material.WireGrade;
import coilwright.material.WireSeries;
import coilwright.material.WireSize;
import coilwright.unit.Dimension;
import java.io.IOException;
import java.util.ArrayList;
import java.util.List;

/** The wire grades of the catalogue, as text and as JSON. */
public final class Grades {

  private static final int SIZES_IN_TEXT = 7;

  private final Catalogue catalogue;
  private final List<String> ids;

  private Grades(Catalogue catalogue, List<String> ids) {
    this.catalogue = catalogue;
    this.ids = List.copyOf(ids);
  }

  /**
   * The grades as text: what they are, their properties over a spread of sizes, and the sources.
   *
   * @param catalogue the catalogue
   * @param ids the grades wanted, in order
   * @return the text
   */
  public static String text(Catalogue catalogue, List<String> ids) {
    return new Grades(catalogue, ids).text();
  }

  /**
   * The grades as JSON: the same, over every size of their usual series.
   *
   * @param catalogue the catalogue
   * @param ids the grades wanted, in order
   * @return the document
   */
  public static String json(Catalogue catalogue, List<String> ids) {
    Grades grades = new Grades(catalogue, ids);
    return Json.document(
        json -> {
          json.count("format", ShortlistJson.FORMAT);
          json.array("materials", grades::materials);
        });
  }

  private String text() {
    StringBuilder text = new StringBuilder();
    for (String id : ids) {
      text.append(text.isEmpty() ? "" : "\n").append(block(catalogue.grade(id)));
    }
    return text.toString();
  }

  private String block(WireGrade grade) {
    TextTable facts = new TextTable("ll");
    facts.row("standard", grade.standard() + ", " + grade.condition());
    facts.row(
        "supply", grade.supply().word() + (grade.common() ? ", tried when no grade is named" : ""));
    facts.row("class", grade.allowableClass().words());
    facts.row(
        "diameters",
        (grade.diameters().min() > 0
                ? Numbers.fixed(grade.diameters().min(), 3) + " to "
                : "up to ")
            + Numbers.fixed(grade.diameters().max(), 3)
            + " mm; series "
            + String.join(", ", grade.usualSeries().stream().map(WireSeries::id).toList()));
    facts.row("density", Numbers.fixed(grade.density(), 0) + " kg/m^3");
    facts.row(
        "service",
        grade.maxServiceTemperature().isPresent()
            ? "up to " + Numbers.fixed(grade.maxServiceTemperature().getAsDouble(), 0) + " degC"
            : "no temperature cited");
    facts.row("cost index", Numbers.fixed(grade.costIndex(), 1) + " (hard-drawn is 1.0)");
    for (GradeSource source : grade.sources()) {
      facts.row(
          "source", source.what() + ": " + source.text() + " (" + source.evidence().word() + ")");
    }
    return grade.id() + "  " + grade.name() + "\n" + facts.text("  ") + properties(grade);
  }

  private String properties(WireGrade grade) {
    TextTable table = new TextTable("lrrrrrl");
    table.row("size", "d mm", "+- mm", "Rm MPa", "G MPa", "E MPa", "data");
    for (Wire wire : spread(wires(grade))) {
      table.row(
          Wires.size(wire),
          Numbers.fixed(wire.diameter(), 3),
          Numbers.fixed(wire.diameterTolerance(), 4),
          Numbers.fixed(wire.tensileStrength(), 0),
          Numbers.fixed(wire.shearModulus(), 0),
          Numbers.fixed(wire.elasticModulus(), 0),
          wire.evidence().word());
    }
    return table.text("  ");
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

  private static List<Wire> spread(List<Wire> wires) {
    if (wires.size() <= SIZES_IN_TEXT) {
      return wires;
    }
    List<Wire> spread = new ArrayList<>();
    for (int i = 0; i < SIZES_IN_TEXT; i++) {
      spread.add(wires.get(i * (wires.size() - 1) / (SIZES_IN_TEXT - 1)));
    }
    return spread;
  }

  private void materials(Json json) throws IOException {
    for (String id : ids) {
      json.braces(body -> material(body, catalogue.grade(id)));
    }
  }

  private void material(Json json, WireGrade grade) throws IOException {
    json.string("id", grade.id());
    json.string("name", grade.name());
    json.string("standard", grade.standard());
    json.string("condition", grade.condition());
    json.string("supply", grade.supply().word());
    json.flag("common", grade.common());
    json.string("allowable_class", grade.allowableClass().words());
    json.number("min_wire_diameter_mm", grade.diameters().min());
    json.number("max_wire_diameter_mm", grade.diameters().max());
    json.number("density_kg_per_m3", grade.density());
    if (grade.maxServiceTemperature().isPresent()) {
      json.number("max_service_temperature_degc", grade.maxServiceTemperature().getAsDouble());
    }
    json.number("cost_index", grade.costIndex());
    json.strings("usual_series", grade.usualSeries().stream().map(WireSeries::id).toList());
    json.array("wires", list -> wires(list, grade));
    json.array("sources", list -> sources(list, grade));
  }

  private void wires(Json json, WireGrade grade) throws IOException {
    for (Wire wire : wires(grade)) {
      json.braces(
          body -> {
            body.string("wire_series", wire.size().series().orElseThrow().id());
            body.string("wire_size", wire.size().label());
            body.number("wire_diameter_mm", wire.diameter());
            body.number("wire_diameter_tolerance_mm", wire.diameterTolerance());
            body.number("tensile_strength_mpa", plain(wire.tensileStrength()));
            body.number("shear_modulus_mpa", plain(wire.shearModulus()));
            body.number("elastic_modulus_mpa", plain(wire.elasticModulus()));
            body.string("data", wire.evidence().word());
          });
    }
  }

  private static double plain(double stress) {
    return OutputUnits.plain(Dimension.STRESS, stress);
  }

  private static void sources(Json json, WireGrade grade) throws IOException {
    for (GradeSource source : grade.sources()) {
      json.braces(
          body -> {
            body.string("what", source.what());
            body.string("source", source.text());
            body.string("data", source.evidence().word());
          });
    }
  }
}
