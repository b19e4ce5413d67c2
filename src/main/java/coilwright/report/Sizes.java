package coilwright.report;

import coilwright.material.Catalogue;
import coilwright.material.WireSeries;
import coilwright.material.WireSize;
import coilwright.problem.UnitSystem;
import coilwright.unit.Dimension;
import java.io.IOException;
import java.util.ArrayList;
import java.util.Iterator;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;

/** Wire sizes of the catalogue by series. */
public final class Sizes implements Result {

  private static final List<Field<Sourced>> SOURCE = List.of(Word.ours("source", Sourced::source));

  private final Catalogue catalogue;
  private final List<WireSeries> wanted;

  /**
   * Sizes to show.
   *
   * @param catalogue the catalogue
   * @param wanted the series wanted, in order
   */
  public Sizes(Catalogue catalogue, List<WireSeries> wanted) {
    this.catalogue = catalogue;
    this.wanted = List.copyOf(wanted);
  }

  /**
   * A size and where it is published.
   *
   * @param size the size
   * @param source publication and place, in a line
   */
  private record Sourced(WireSize size, String source) {}

  /** In both units, the ones asked for first. */
  @Override
  public String text(UnitSystem units) {
    StringBuilder text = new StringBuilder();
    for (WireSeries series : wanted) {
      text.append(text.isEmpty() ? "" : "\n").append(block(series, units == UnitSystem.INCH));
    }
    return text.toString();
  }

  private String block(WireSeries series, boolean inch) {
    OutputUnits first = inch ? OutputUnits.INCH : OutputUnits.METRIC;
    OutputUnits second = inch ? OutputUnits.METRIC : OutputUnits.INCH;
    List<String> notes = new ArrayList<>();
    TextTable table = new TextTable("rrrll");
    table.row(
        "size", first.symbol(Dimension.LENGTH), second.symbol(Dimension.LENGTH), "data", "source");
    for (Sourced sourced : of(series)) {
      if (!notes.contains(sourced.source())) {
        notes.add(sourced.source());
      }
      WireSize size = sourced.size();
      table.row(
          size.label(),
          first.fixed(Dimension.LENGTH, size.diameter(), 3),
          second.fixed(Dimension.LENGTH, size.diameter(), 3),
          size.evidence().word(),
          "[" + (notes.indexOf(sourced.source()) + 1) + "]");
    }
    StringBuilder text = new StringBuilder(series.id() + "\n" + table.text("  "));
    for (int i = 0; i < notes.size(); i++) {
      text.append("  [").append(i + 1).append("] ").append(notes.get(i)).append('\n');
    }
    return text.toString();
  }

  /** The same. */
  @Override
  public String json() {
    return Json.document(
        json -> {
          json.count("format", ShortlistJson.FORMAT);
          json.array("wires", this::wires);
        });
  }

  private void wires(Json json) throws IOException {
    for (Sourced sourced : all()) {
      json.braces(
          body -> {
            body.fields(GradeFields.SIZE, sourced.size());
            body.fields(GradeFields.EVIDENCE, sourced.size());
            body.fields(SOURCE, sourced);
          });
    }
  }

  /** One row a size. */
  @Override
  public String csv(UnitSystem units) {
    Function<Sourced, Optional<WireSize>> size = row -> Optional.of(row.size());
    return new Columns<Sourced>(OutputUnits.ofData(units))
        .addPart("", GradeFields.SIZE, size)
        .addPart("", GradeFields.EVIDENCE, size)
        .add(SOURCE)
        .table(all());
  }

  private List<Sourced> all() {
    List<Sourced> all = new ArrayList<>();
    wanted.forEach(series -> all.addAll(of(series)));
    return all;
  }

  private List<Sourced> of(WireSeries series) {
    Iterator<String> sources = catalogue.sizeSources(series).iterator();
    return catalogue.sizes(series).stream().map(size -> new Sourced(size, sources.next())).toList();
  }
}
