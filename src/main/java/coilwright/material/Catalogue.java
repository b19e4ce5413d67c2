package coilwright.material;

import java.util.List;

/** The wire grades and sizes that the program knows, read from the cited tables it ships. */
public final class Catalogue {

  private Catalogue() {}

  /** The catalogue; tables are read when first asked for. */
  public static Catalogue load() {
    return new Catalogue();
  }

  /** Ids of all grades, in the catalogue's order. */
  public List<String> gradeIds() {
    throw new IllegalStateException("being written");
  }

  /**
   * The grade with an id.
   *
   * @param id one of {@link #gradeIds()}
   * @return the grade
   * @throws IllegalArgumentException if there is none
   */
  public WireGrade grade(String id) {
    throw new IllegalStateException("being written");
  }

  /**
   * The sizes of a series, rising.
   *
   * @param series the series
   * @return its sizes
   */
  public List<WireSize> sizes(WireSeries series) {
    throw new IllegalStateException("being written");
  }
}
