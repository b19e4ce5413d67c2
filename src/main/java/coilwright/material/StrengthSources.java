package coilwright.material;

import coilwright.source.Evidence;
import java.util.ArrayList;
import java.util.List;

/** Says where a grade's strength comes from: one line for what was seen, one for what was not. */
final class StrengthSources {

  private static final String WHAT = "strength";
  private static final String DIAMETER = "diameter";

  private StrengthSources() {}

  /**
   * The sources of a table by diameter.
   *
   * @param rows the grade's rows
   * @return a line for each kind of evidence there is; where there are both, with its diameters
   */
  static List<GradeSource> of(List<TableRow> rows) {
    String seen = parts(rows, Evidence.SEEN);
    String remembered = parts(rows, Evidence.MEMORY);
    boolean mixed = !seen.isEmpty() && !remembered.isEmpty();
    List<GradeSource> sources = new ArrayList<>();
    for (Evidence evidence : Evidence.values()) {
      String parts = evidence == Evidence.SEEN ? seen : remembered;
      if (!parts.isEmpty()) {
        String place = first(rows, evidence).place() + (mixed ? ", rows " + parts : "");
        sources.add(new GradeSource(WHAT, place, evidence));
      }
    }
    return sources;
  }

  private static TableRow first(List<TableRow> rows, Evidence evidence) {
    int i = 0;
    while (rows.get(i).evidence() != evidence) {
      i++;
    }
    return rows.get(i);
  }

  /** The source of a formula. */
  static List<GradeSource> of(TableRow row) {
    return List.of(new GradeSource(WHAT, row.place(), row.evidence()));
  }

  /** The sources of one strength for many diameters: of the strength, and of the diameters. */
  static List<GradeSource> ofFlat(TableRow row) {
    List<GradeSource> sources = new ArrayList<>(of(row));
    String diameters =
        row.text("diameter_min")
            + " to "
            + row.text("diameter_max")
            + " "
            + row.header().unitOf("diameter_max");
    String place = row.citation().place() + ", that it holds for " + diameters;
    sources.add(new GradeSource(WHAT, place, ofDiameters(row)));
    return sources;
  }

  /** Whether the diameters of a flat strength were seen. */
  static Evidence ofDiameters(TableRow row) {
    return row.oneOf("diameters_evidence", Evidence.values(), Evidence::word);
  }

  /** The stretches of rows of one evidence: ".009 to .080 in", or two and more of them. */
  private static String parts(List<TableRow> rows, Evidence evidence) {
    StringBuilder parts = new StringBuilder();
    for (int i = 0; i < rows.size(); i++) {
      if (rows.get(i).evidence() == evidence) {
        int last = i;
        while (last + 1 < rows.size() && rows.get(last + 1).evidence() == evidence) {
          last++;
        }
        parts.append(parts.isEmpty() ? "" : " and ").append(rows.get(i).text(DIAMETER));
        parts.append(last > i ? " to " + rows.get(last).text(DIAMETER) : "");
        i = last;
      }
    }
    return parts.isEmpty() ? "" : parts + " " + rows.get(0).header().unitOf(DIAMETER);
  }
}
