package coilwright.material;

import java.util.Optional;

/** A published series of wire sizes. */
public enum WireSeries {
  /** The preferred metric sizes. */
  METRIC("metric"),
  /** The gauge of music wire; numbers rise with size. */
  MUSIC_WIRE_GAUGE("music-wire-gauge");

  private final String id;

  WireSeries(String id) {
    this.id = id;
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
