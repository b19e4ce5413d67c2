package coilwright.cli;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Results in inches and pounds say what the metric ones say. */
class InchTest {

  /** Exact: inch 25.4 mm, pound 0.45359237 kg, standard gravity 9.80665 m/s^2. */
  private static final double LBF = 0.45359237 * 9.80665;

  private static final Map<String, Double> FACTOR =
      Map.of(
          "in",
          25.4,
          "lbf",
          LBF,
          "lbf_per_in",
          LBF / 25.4,
          "psi",
          LBF / (25.4 * 25.4),
          "lbf_in",
          LBF * 25.4,
          "lbf_in_per_deg",
          LBF * 25.4,
          "lb",
          453.59237,
          "lb_per_in3",
          453.59237e-3 / Math.pow(0.0254, 3));

  private static final Map<String, String> INCH =
      Map.of(
          "mm", "in",
          "n", "lbf",
          "n_per_mm", "lbf_per_in",
          "n_mm", "lbf_in",
          "n_mm_per_deg", "lbf_in_per_deg",
          "mpa", "psi",
          "g", "lb",
          "kg_per_m3", "lb_per_in3");

  private static final Map<String, String> UNITS =
      Map.of("mm", "in", "N", "lbf", "N/mm", "lbf/in", "N*mm", "lbf*in", "MPa", "psi");

  @Test
  void everyNumberOfAShortlistIsTheMetricOneConverted() {
    String twins = Run.VALVE.replace("spring:", "springs_in_parallel: 2\nspring:");
    String beyond = Run.VALVE + "overtravel: {length: 21 mm}\n";
    for (String problem : new String[] {Run.VALVE, twins, beyond}) {
      converted(problem, "shortlist", "-", "--all");
    }
  }

  @ParameterizedTest
  @ValueSource(strings = {"louvre-return", "shade-tensioner", "vent-flap-hinge", "bin-lid"})
  void everyNumberOfADemoWithHooksOrLegsIsTheMetricOneConverted(String demo) {
    converted(Run.demo(demo), "shortlist", "-", "--all");
  }

  @Test
  void everyNumberOfACheckAndTheCatalogueIsTheMetricOneConverted() {
    converted(Run.DESIGN, "check", "-");
    converted(Run.WEAK, "check", "-");
    converted("", "materials", "music-wire", "stainless-302", "en-10270-1-sh");
    converted("", "wires");
  }

  @Test
  void theFilesUnitsAreThoseOfCsv() {
    String inch = "units: inch\n" + Run.VALVE;
    assertThat(csv(inch, "shortlist", "-").header()).contains("mass_lb", "rate_lbf_per_in");
    assertThat(csv(inch, "shortlist", "-", "--units=metric").header()).contains("mass_g");
  }

  @Test
  void jsonIsMetricWhateverIsAsked() {
    String[] args = {"shortlist", "-", "--format=json"};
    assertThat(Run.reading(Run.VALVE, "shortlist", "-", "--format=json", "--units=inch").bytes())
        .isEqualTo(Run.reading(Run.VALVE, args).bytes());
  }

  @Test
  void whatIsTypedInInchesComesBackAsTyped() {
    String file =
        """
        units: inch
        spring: compression
        loads: [{length: 1.25 in, force: 4 lbf, tolerance: 0.5 lbf}, {length: 0.875 in, force: 10.25 lbf}]
        envelope: {bore: 0.6875 in, rod: 0.3125 in, diametral_clearance: 0.02 in, max_solid_length: 0.71875 in}
        make: {wire_sizes: [0.063 in, 1.4 mm, 0.0551 in], materials: [music-wire]}
        """;
    String text = Run.reading(file, "shortlist", "-").found(Status.FOUND).out();
    assertThat(text)
        .contains("4 lbf (+0.5 -0.5 lbf accepted, not judged) at 1.25 in; 10.25 lbf at 0.875 in")
        .contains("bore 0.6875 in, rod 0.3125 in", "solid length up to 0.71875 in")
        .contains("rate 16.667 lbf/in, free length 1.49 in, from two loads at lengths")
        .contains("wire       0.063 in, 1.4 mm, 0.0551 in")
        .contains("mean diameter 0.0005 in (a tenth below 0.19685 in mean diameter)")
        .contains("  0.063 in", "also: #2 music-wire, 1.4 mm = 0.0551 in,");
    assertThat(text.replace("1.4 mm", "")).doesNotContainPattern("[0-9] (mm|N|MPa|g)\\b");
  }

  @Test
  void textNamesNoMetricUnit() {
    for (String problem : new String[] {Run.DESIGN, Run.WEAK}) {
      String text = Run.reading(problem, "check", "-", "--units=inch").out();
      assertThat(text.replace("1.3 mm", "").replace("1.0 mm", ""))
          .contains("ksi", "lbf/in", " oz\n", " in\n")
          .doesNotContainPattern("\\b(mm|N|MPa|g|N/mm)\\b");
    }
    assertThat(Run.reading(Run.CRAMPED, "shortlist", "-", "--units=inch").out())
        .contains("allowed 0.118 in")
        .doesNotContainPattern("\\b(N|MPa|g)\\b");
    assertThat(Run.of("materials", "music-wire", "--units=inch").out())
        .contains("0.0040 to 0.2500 in", "0.284 lb/in^3", "up to 250 degF", "d in    +- in  Rm ksi")
        .doesNotContainPattern("\\b(mm|MPa|degC|m\\^3)\\b");
    assertThat(Run.of("wires", "music-wire-gauge", "--units=inch").out())
        .contains("   size      in     mm  data  source\n    6/0  0.0040  0.102  seen  [1]\n");
  }

  private static void converted(String problem, String... args) {
    CsvRows metric = csv(problem, with(args, "--units=metric"));
    CsvRows inch = csv(problem, with(args, "--units=inch"));
    assertThat(inch.rows()).hasSameSizeAs(metric.rows()).isNotEmpty();
    assertThat(inch.header()).isEqualTo(metric.header().stream().map(InchTest::inInches).toList());
    List<String> wrong = new ArrayList<>();
    for (int i = 0; i < metric.rows().size(); i++) {
      for (String name : metric.header()) {
        if (!same(name, metric.rows().get(i), inch.rows().get(i))) {
          wrong.add("row " + (i + 1) + ", " + name);
        }
      }
    }
    assertThat(wrong).isEmpty();
  }

  private static boolean same(String name, Map<String, String> metric, Map<String, String> inch) {
    String cell = metric.get(name);
    String other = inch.get(inInches(name));
    double factor = factor(name, metric, inch);
    if (name.endsWith("_unit")) {
      return other.equals(UNITS.getOrDefault(cell, cell));
    }
    if (factor == 1 || cell.isEmpty()) {
      return other.equals(cell);
    }
    double value = Double.parseDouble(cell);
    return Math.abs(Double.parseDouble(other) * factor - value) <= 1e-12 * Math.abs(value);
  }

  /** What one of the inch column's units is in the metric column's. */
  private static double factor(String name, Map<String, String> metric, Map<String, String> inch) {
    String unit = metric.get(name.replaceFirst("_(value|bound|slack)$", "_unit"));
    if (name.startsWith("check_") && name.matches(".*_(value|bound|slack)")) {
      return switch (unit) {
        case "mm" -> FACTOR.get("in");
        case "N" -> FACTOR.get("lbf");
        case "N*mm" -> FACTOR.get("lbf_in");
        case "MPa" -> FACTOR.get("psi");
        default -> 1;
      };
    }
    String shown = suffix(inInches(name));
    return inInches(name).equals(name) ? 1 : FACTOR.get(shown);
  }

  private static String inInches(String name) {
    String unit = suffix(name);
    return unit.isEmpty() || !INCH.containsKey(unit)
        ? name
        : name.substring(0, name.length() - unit.length()) + INCH.get(unit);
  }

  /** The unit that a name ends in, the longest that fits. */
  private static String suffix(String name) {
    List<String> known = new ArrayList<>(INCH.keySet());
    known.addAll(INCH.values());
    return known.stream()
        .filter(unit -> name.endsWith("_" + unit))
        .max((a, b) -> a.length() - b.length())
        .orElse("");
  }

  private static CsvRows csv(String problem, String... args) {
    return CsvRows.of(Run.reading(problem, with(args, "--format=csv")).out());
  }

  private static String[] with(String[] args, String more) {
    List<String> all = new ArrayList<>(List.of(args));
    all.add(more);
    return all.toArray(String[]::new);
  }
}
