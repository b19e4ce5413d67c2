package coilwright.cli;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;

/** A wrong command line is status 2 and one line that says where, what was found, what to do. */
class BadCommandLineTest {

  private static final String FILE = "valve.yaml";
  private static final String COMMANDS = "accepted: shortlist, check, materials, wires, starter";
  private static final String NO_FILE =
      "FILE is missing; give the problem file, or - for standard input";
  private static final String RANKS = "accepted: mass, margin, cost, robust";
  private static final String COUNT = "accepted: a whole number from 1 to 999999";

  @Test
  void commands() {
    refused("coilwright: a command is missing; " + COMMANDS);
    refused(
        "coilwright: no command \"shortlst\"; " + COMMANDS + " (did you mean shortlist?)",
        "shortlst");
    refused("coilwright: no command \"Check\"; " + COMMANDS + " (did you mean check?)", "Check");
    refused("coilwright: no command \"quote\"; " + COMMANDS, "quote", FILE);
    refused("coilwright: no command \"\"; " + COMMANDS, "");
    refused("coilwright: no command \"@args\"; " + COMMANDS, "@args");
    refused("coilwright: no command \"a b\"; " + COMMANDS, "a\nb");
    refused("coilwright: --nope: no such option; accepted: --help, --version", "--nope");
    refused("coilwright: --hlp: no such option; did you mean --help?", "--hlp");
    refused(
        "coilwright: --top: no option here; put it behind the command and its file",
        "--top",
        "3",
        "shortlist",
        FILE);
  }

  @Test
  void files() {
    refused("coilwright shortlist: " + NO_FILE, "shortlist");
    refused("coilwright shortlist: " + NO_FILE, "shortlist", "--all", "--top", "3");
    refused("coilwright check: " + NO_FILE, "check");
    refused(
        "coilwright shortlist: \"b.yaml\" is one argument too many; give one FILE a run",
        "shortlist",
        FILE,
        "b.yaml");
    refused(
        "coilwright check: \"b.yaml\" is one argument too many; give one FILE a run",
        "check",
        FILE,
        "b.yaml",
        "c.yaml");
  }

  @Test
  void optionsUnknown() {
    shortlist("--tpo: no such option; did you mean --top?", "--tpo", "3");
    shortlist("--tpo: no such option; did you mean --top?", "--tpo=3");
    shortlist("--TOP: no such option; did you mean --top?", "--TOP", "3");
    shortlist("-top: no such option; did you mean --top?", "-top", "3");
    shortlist("--rnak: no such option; did you mean --rank?", "--rnak", "mass");
    shortlist("--output: no such option; did you mean --out?", "--output", "x");
    shortlist(
        "--colour: no such option; accepted: --all, --force, --format, --help, --out, --rank,"
            + " --top, --units, --version",
        "--colour");
    refused(
        "coilwright check: --top: no such option; accepted: --force, --format, --help, --out,"
            + " --units, --version",
        "check",
        FILE,
        "--top",
        "3");
    refused(
        "coilwright materials: --rank: no such option; accepted: --force, --format, --help, --out,"
            + " --units, --version",
        "materials",
        "--rank");
    refused(
        "coilwright starter: --format: no such option; accepted: --force, --help, --out, --schema,"
            + " --version",
        "starter",
        "--schema",
        "--format",
        "json");
    refused(
        "coilwright wires: --top: no such option; accepted: --force, --format, --help, --out,"
            + " --units, --version",
        "wires",
        "--top",
        "2");
    refused(
        "coilwright starter: KIND: \"json\"; accepted: compression, extension, torsion",
        "starter",
        "--schema",
        "json");
    refused(
        "coilwright starter: KIND: \"json\"; accepted: compression, extension, torsion",
        "starter",
        "--",
        "json");
  }

  @Test
  void optionsTwiceOrWithoutValue() {
    shortlist("--top: given twice; give it once", "--top", "3", "--top", "4");
    shortlist("--format: given twice; give it once", "--format=json", "--format=text");
    shortlist("--all: takes no value; give it alone", "--all=maybe");
    shortlist("--top: its value is missing; give N", "--top");
    shortlist("--out: its value is missing; give FILE", "--out");
    shortlist("--format: its value is missing; give text, json or csv", "--format");
    shortlist("--rank: its value is missing; give mass, margin, cost or robust", "--rank", "--all");
  }

  @Test
  void values() {
    for (String count : new String[] {"0", "-1", "x", "", "1.5", "007", "+3", " 3", "1000000"}) {
      shortlist("--top: \"" + count + "\"; " + COUNT, "--top=" + count);
    }
    shortlist("--top: \"-1\"; " + COUNT, "--top", "-1");
    shortlist("--rank: \"mas\"; " + RANKS + " (did you mean mass?)", "--rank", "mas");
    shortlist("--rank: \"MASS\"; " + RANKS + " (did you mean mass?)", "--rank", "MASS");
    shortlist("--rank: \"price\"; " + RANKS, "--rank", "price");
    shortlist("--format: \"xml\"; accepted: text, json, csv", "--format", "xml");
    shortlist("--format: \"\"; accepted: text, json, csv", "--format=");
    shortlist("--units: \"furlong\"; accepted: metric, inch", "--units", "furlong");
  }

  @Test
  void kindsAndSeries() {
    refused(
        "coilwright starter: KIND: \"torsoin\"; accepted: compression, extension, torsion (did you mean torsion?)",
        "starter",
        "torsoin");
    Run.of("wires", "brown-sharp")
        .refused(
            "coilwright wires: SERIES: \"brown-sharp\"; accepted: metric, music-wire-gauge,"
                + " steel-wire-gauge, brown-sharpe (did you mean brown-sharpe?)");
  }

  @Test
  void optionsOfTheStarter() {
    refused("coilwright starter: --schema: takes no value; give it alone", "starter", "--schema=x");
    refused(
        "coilwright starter: --schema: given twice; give it once",
        "starter",
        "--schema",
        "--schema");
    refused(
        "coilwright starter: --shema: no such option; did you mean --schema?",
        "starter",
        "--shema");
    refused(
        "coilwright starter: --format: no such option; accepted: --force, --help, --out, --schema,"
            + " --version",
        "starter",
        "compression",
        "--format",
        "json");
    refused(
        "coilwright starter: KIND: \"leaf\"; accepted: compression, extension, torsion",
        "starter",
        "leaf",
        "--schema");
    refused(
        "coilwright starter: KIND is missing; give the kind of spring: compression, extension or torsion",
        "starter",
        "--force");
    refused(
        "coilwright: --schema: no option here; put it behind the command and its file",
        "--schema",
        "starter");
    shortlist(
        "--schema: no such option; accepted: --all, --force, --format, --help, --out, --rank,"
            + " --top, --units, --version",
        "--schema");
  }

  @Test
  void valuesOfFormatAndUnits() {
    shortlist("--format: \"CSV\"; accepted: text, json, csv (did you mean csv?)", "--format=CSV");
    shortlist(
        "--format: \"cvs\"; accepted: text, json, csv (did you mean csv?)", "--format", "cvs");
    shortlist(
        "--format: \"text,csv\"; accepted: text, json, csv (did you mean text?)",
        "--format",
        "text,csv");
    shortlist("--units: \"inches\"; accepted: metric, inch (did you mean inch?)", "--units=inches");
    shortlist("--units: \"mm\"; accepted: metric, inch", "--units", "mm");
    shortlist("--units: \"\"; accepted: metric, inch", "--units=");
    shortlist("--units: given twice; give it once", "--units=inch", "--units=metric");
    shortlist("--units: its value is missing; give metric or inch", "--units");
    refused(
        "coilwright check: --units: \"in\"; accepted: metric, inch (did you mean inch?)",
        "check",
        FILE,
        "--units",
        "in");
    refused(
        "coilwright check: --format: given twice; give it once",
        "check",
        FILE,
        "--format=csv",
        "--format=csv");
    refused(
        "coilwright materials: --format: \"yaml\"; accepted: text, json, csv",
        "materials",
        "--format",
        "yaml");
    refused(
        "coilwright wires: --units: its value is missing; give metric or inch", "wires", "--units");
  }

  @Test
  void namesOfThings() {
    refused(
        "coilwright starter: KIND is missing; give the kind of spring: compression, extension or torsion",
        "starter");
    refused(
        "coilwright starter: KIND: \"compresion\"; accepted: compression, extension, torsion (did you mean"
            + " compression?)",
        "starter",
        "compresion");
    refused(
        "coilwright starter: \"compression\" is one argument too many; give one KIND a run",
        "starter",
        "compression",
        "compression");
    Run.of("wires", "metrik")
        .refused("coilwright wires: SERIES: \"metrik\"; accepted: ", "(did you mean metric?)");
    Run.of("materials", "musik-wire")
        .refused("coilwright materials: ID: \"musik-wire\"; accepted: ")
        .refused("(did you mean music-wire?)");
  }

  private static void shortlist(String message, String... options) {
    String[] args = new String[options.length + 2];
    args[0] = "shortlist";
    args[1] = FILE;
    System.arraycopy(options, 0, args, 2, options.length);
    refused("coilwright shortlist: " + message, args);
  }

  private static void refused(String message, String... args) {
    Run run = Run.of(args).fault(Status.REFUSED);
    String command = message.substring(0, message.indexOf(':'));
    assertThat(run.err()).isEqualTo(message + "\nTry: " + command + " --help\n");
  }
}
