package coilwright.material;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** A published series of wire sizes. */
public enum WireSeries {
  /** The preferred metric sizes. */
  METRIC("metric"),
  /** The gauge of music wire, whose numbers rise with size, and the decimal sizes beside it. */
  MUSIC_WIRE_GAUGE("music-wire-gauge", "sizes-astm-a228-decimal"),
  /** The American gauge of other steel wire; numbers fall with size. */
  STEEL_WIRE_GAUGE("steel-wire-gauge"),
  /** The American gauge of copper and nickel alloys; numbers fall with size. */
  BROWN_SHARPE("brown-sharpe");

  private final String id;
  private final List<String> files;

  WireSeries(String id, String... more) {
    this.id = id;
    List<String> all = new ArrayList<>(List.of("sizes-" + id));
    all.addAll(List.of(more));
    this.files = List.copyOf(all);
  }

  /** The tables of the catalogue that hold its sizes, each rising by itself. */
  List<String> files() {
    return files;
  }

  /** The id used in problem files and output. */
  public String id() {
    return id;
  }

  /**
   * The series with an id.
   *
   * @param id as in problem files
   * @return the series, or empty
   */
  public static Optional<WireSeries> of(String id) {
    for (WireSeries series : values()) {
      if (series.id.equals(id)) {
        return Optional.of(series);
      }
    }
    return Optional.empty();
  }
}
