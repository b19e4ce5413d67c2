package coilwright.report;

import coilwright.material.Catalogue;
import coilwright.material.WireSeries;
import coilwright.material.WireSize;
import coilwright.unit.Dimension;
import coilwright.unit.Unit;
import java.io.IOException;
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
      TextTable table = new TextTable("rrrl");
      table.row("size", "mm", "in", "data");
      for (WireSize size : catalogue.sizes(series)) {
        table.row(
            size.label(),
            Numbers.fixed(size.diameter(), 3),
            Numbers.fixed(INCH.fromInner(size.diameter()), 4),
            size.evidence().word());
      }
      text.append(text.isEmpty() ? "" : "\n").append(series.id()).append('\n');
      text.append(table.text("  "));
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
      for (WireSize size : catalogue.sizes(series)) {
        json.braces(
            body -> {
              body.string("wire_series", series.id());
              body.string("wire_size", size.label());
              body.number("wire_diameter_mm", size.diameter());
              body.string("data", size.evidence().word());
            });
      }
    }
  }
}
