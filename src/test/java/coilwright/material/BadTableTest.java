package coilwright.material;

import static org.assertj.core.api.Assertions.assertThatIllegalStateException;

import org.junit.jupiter.api.Test;

/** A bad catalogue file stops the program and says where it is bad. */
class BadTableTest {

  private static final String A228 = "strength-astm-a228.csv";
  private static final String MODULI = "moduli-shigley.csv";
  private static final String TOLERANCE = "tolerance-astm-a228.csv";
  private static final String GAUGE = "sizes-music-wire-gauge.csv";

  @Test
  void rowsThatDoNotLoad() {
    refused(A228, "0.006,415,seen", "0.006,415,", "line 11", "column evidence", "empty");
    refused(A228, "0.006,415,seen", "0.006,415,heard", "line 11", "column evidence", "heard");
    refused(A228, "0.006,415,seen", "0.006,415", "line 11", "column strength", "found 2 cells");
    refused(A228, "0.006,415,seen", "0.006,415,seen,", "line 11", "found 4 cells");
    refused(A228, "0.006,415,seen", "", "line 11", "found 1 cells");
    refused(A228, "0.006,415,seen", "0.006,\"415,seen", "line 11", "quote is not closed");
    refused(A228, "0.006,415,seen", "0.006,4\"15,seen", "line 11", "quote");
    refused(A228, "0.006,415,seen", "0.006,\"415\"0,seen", "line 11", "quote");
  }

  @Test
  void cellsThatAreNoNumbers() {
    refused(A228, "0.006,415,", "0.006,,", "line 11", "column strength", "empty");
    refused(A228, "0.006,415,", "0.006,-415,", "line 11", "column strength", "-415");
    refused(A228, "0.006,415,", "0.006,0,", "line 11", "column strength", "positive");
    refused(A228, "0.006,415,", "0.006,4e2,", "line 11", "column strength", "4e2");
    refused(A228, "0.006,415,", "0.006,4.1.5,", "line 11", "column strength", "4.1.5");
    refused(A228, "0.006,415,", "0.006,.,", "line 11", "column strength", "decimal");
    refused(A228, "0.006,415,", "0.006, 415,", "line 11", "column strength", "decimal");
    refused(A228, "0.250,230,", "any,230,", "line 66", "column diameter", "any");
  }

  @Test
  void diametersThatDoNotRise() {
    refused(A228, "0.006,", "0.004,", "line 11", "column diameter", "rise");
    refused(MODULI, "music-wire,0.063,", "music-wire,0.032,", "line 9", "column up_to", "rise");
    refused(TOLERANCE, "0.028,0.063,", "0.028,0.028,", "line 10", "column up_to", "rise");
    refused(TOLERANCE, "0.028,0.063,", "0.027,0.063,", "line 10", "column from", "overlap");
    refused(TOLERANCE, "0.028,0.063,", "0.064,0.063,", "line 10", "column from", "overlap");
    refused(MODULI, "music-wire,0.063,", "music-wire,any,", "line 10", "column up_to", "rise");
  }

  @Test
  void headersThatDoNotCite() {
    refused(A228, "# source: ASTM A228\n", "", "the header has no line \"# source: ...\"");
    refused(A228, "# locator: ", "# place: ", "the header has no line \"# locator: ...\"");
    refused(A228, "# rule: interpolate\n", "", "the header has no line \"# rule: ...\"");
    refused(A228, "# rule: interpolate\n", "# rule: guess\n", "guess", "interpolate");
    refused(A228, "# units: ", "# sizes: ", "the header has no line \"# units: ...\"");
    refused(A228, "strength ksi", "hardness ksi", "column strength");
    refused(A228, "strength ksi", "strength kg", "column strength", "kg");
    refused(A228, "# source: ASTM A228", "# source: hearsay", "column source", "hearsay");
    refused(A228, "# rule: interpolate", "# interpolate", "line 5", "# key: words");
  }

  @Test
  void columnsThatAreMissingOrTwice() {
    refused(A228, "diameter,strength,evidence", "diameter,force,evidence", "column strength");
    refused(A228, "diameter,strength,evidence", "diameter,strength,strength", "line 8", "strength");
  }

  @Test
  void gradesThatNameWhatIsNotThere() {
    refused(
        "grades.csv",
        "us,true,cold-drawn-carbon,strength-astm-a228,",
        "us,yes,cold-drawn-carbon,strength-astm-a228,",
        "column common");
    refused(
        "grades.csv",
        "cold-drawn-carbon,strength-astm-a228",
        "cold,strength-astm-a228",
        "column allowable_class");
    refused(
        "grades.csv", "music-wire-gauge,ASTM A228", "music-gauge,ASTM A228", "column usual_series");
    refused("grades.csv", "hard-drawn,hard", "music-wire,hard", "line 10", "column id", "second");
    refused(MODULI, "music-wire,", "piano-wire,", "column grade", "music-wire");
    refused("properties.csv", "music-wire,density,", "hard-drawn,density,", "column id", "density");
    refused(
        "properties.csv",
        "music-wire,service temperature,250,degF",
        "music-wire,service temperature,250,degR",
        "column unit");
    refused(
        "properties.csv",
        "music-wire,cost index,",
        "music-wire,density,",
        "column property",
        "second density");
    refused(
        "properties.csv",
        "music-wire,cost index,2.6,-",
        "music-wire,cost index,2.6,lb",
        "column unit");
    refused("properties.csv", "music-wire,cost index,", "music-wire,colour,", "column property");
  }

  @Test
  void rulesThatNeedMoreThanARow() {
    String flat = "strength-nickel-alloys.csv";
    refusedFor("monel-400", flat, ",145,memory,", ",145,,", "column diameters_evidence", "empty");
    refusedFor("monel-400", flat, ",145,memory,", ",145,no,", "column diameters_evidence", "no");
    refusedFor("monel-400", flat, "monel-400,", "monel-401,", "column grade", "monel-400");
    String formula = "strength-en-10270-1.csv";
    refusedFor("en-10270-1-dh", formula, "820,2800,", "820,most,", "column greatest", "most");
    String steps = "strength-en-10270-2.csv";
    refusedFor("en-10270-2-fdc", steps, "smallest: 0.50", "smallest: 0.8", "below the first");
    refusedFor("en-10270-2-fdc", steps, "smallest: 0.50", "smallest: half", "must be a number");
  }

  @Test
  void filesThatAreNotThere() {
    Catalogue catalogue = Shipped.with("grades.csv", "strength-astm-a228,", "strength-astm-a22,");
    assertThatIllegalStateException()
        .isThrownBy(() -> catalogue.grade("music-wire"))
        .withMessage("catalogue file strength-astm-a22.csv is missing");
  }

  @Test
  void seriesThatRepeatOrFall() {
    seriesRefused(GAUGE, "\n2,0.011", "\n1,0.011", "column label", "second time");
    seriesRefused(GAUGE, "\n2,0.011", "\n2,0.010", "column diameter", "rise");
  }

  private static void refused(String file, String piece, String replacement, String... words) {
    refusedFor("music-wire", file, piece, replacement, words);
  }

  private static void refusedFor(
      String id, String file, String piece, String replacement, String... words) {
    Catalogue catalogue = Shipped.with(file, piece, replacement);
    var failure = assertThatIllegalStateException().isThrownBy(() -> catalogue.grade(id));
    failure.withMessageContaining(".csv, line ").withMessageContainingAll(words);
  }

  @Test
  void decimalSizesThatAreGaugeNumbersToo() {
    seriesRefused("sizes-astm-a228-decimal.csv", "0.028,0.028", "0.029,0.029", "diameter", "rise");
    seriesRefused("sizes-astm-a228-decimal.csv", "0.028,0.028", "12,0.028", "second time");
  }

  private static void seriesRefused(
      String file, String piece, String replacement, String... words) {
    Catalogue catalogue = Shipped.with(file, piece, replacement);
    assertThatIllegalStateException()
        .isThrownBy(() -> catalogue.sizes(WireSeries.MUSIC_WIRE_GAUGE))
        .withMessageContaining(".csv, line ")
        .withMessageContainingAll(words);
  }
}
