package coilwright.report;

import coilwright.material.Catalogue;
import coilwright.material.WireSeries;
import coilwright.material.WireSize;
import coilwright.unit.Dimension;
import coilwright.unit.Unit;
import java.io.IOException;
import java.util.Iterator;
import java.util.List;

/** The wire sizes of the catalogue by series, as text and as JSON. */
public final class Sizes {

  private static final Unit INCH = Dimension.LENGTH.unit("in").orElseThrow();

  private Sizes() {}

  /**
   * The sizes as text.
   *
   * @param catalogue the catalogue
   * @param wanted the series wanted, in order
   * @return the text
   */
  public static String text(Catalogue catalogue, List<WireSeries> wanted) {
    StringBuilder text = new StringBuilder();
    for (WireSeries series : wanted) {
      text.append(text.isEmpty() ? "" : "\n").append(block(catalogue, series));
    }
    return text.toString();
  }

  private static String block(Catalogue catalogue, WireSeries series) {
    List<String> places = catalogue.sizeSources(series);
    List<String> notes = places.stream().distinct().toList();
    TextTable table = new TextTable("rrrll");
    table.row("size", "mm", "in", "data", "source");
    int row = 0;
    for (WireSize size : catalogue.sizes(series)) {
      table.row(
          size.label(),
          Numbers.fixed(size.diameter(), 3),
          Numbers.fixed(INCH.fromInner(size.diameter()), 4),
          size.evidence().word(),
          "[" + (notes.indexOf(places.get(row)) + 1) + "]");
      row++;
    }
    StringBuilder text = new StringBuilder(series.id() + "\n" + table.text("  "));
    for (String note : notes) {
      text.append("  [").append(notes.indexOf(note) + 1).append("] ").append(note).append('\n');
    }
    return text.toString();
  }

  /**
   * The sizes as JSON.
   *
   * @param catalogue the catalogue
   * @param wanted the series wanted, in order
   * @return the document
   */
  public static String json(Catalogue catalogue, List<WireSeries> wanted) {
    return Json.document(
        json -> {
          json.count("format", ShortlistJson.FORMAT);
          json.array("wires", list -> sizes(list, catalogue, wanted));
        });
  }

  private static void sizes(Json json, Catalogue catalogue, List<WireSeries> wanted)
      throws IOException {
    for (WireSeries series : wanted) {
      Iterator<String> places = catalogue.sizeSources(series).iterator();
      for (WireSize size : catalogue.sizes(series)) {
        json.braces(
            body -> {
              body.string("wire_series", series.id());
              body.string("wire_size", size.label());
              body.number("wire_diameter_mm", size.diameter());
              body.string("data", size.evidence().word());
              body.string("source", places.next());
            });
      }
    }
  }
}
