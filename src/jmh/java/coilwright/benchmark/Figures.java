package coilwright.benchmark;

import coilwright.docs.Section;
import java.io.IOException;
import java.util.Collection;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.TreeMap;
import org.openjdk.jmh.results.RunResult;
import org.openjdk.jmh.runner.Runner;
import org.openjdk.jmh.runner.RunnerException;
import org.openjdk.jmh.runner.options.OptionsBuilder;

/** Measures everything in one run and writes the figures to their part of results/benchmarks.md. */
public final class Figures {

  private static final String PROBLEMS = "src/jmh/resources/benchmark/";

  private static final List<String> SEARCHED =
      List.of("typical", "loose", "infeasible", "whole", "stroke", "extension", "torsion");

  private Figures() {}

  /**
   * Measures and writes.
   *
   * @param args not used
   * @throws RunnerException if a benchmark fails
   * @throws IOException if the figures cannot be written
   * @throws InterruptedException if stopped
   */
  public static void main(String[] args) throws RunnerException, IOException, InterruptedException {
    Collection<RunResult> results =
        new Runner(new OptionsBuilder().include(SearchBenchmark.class.getName()).build()).run();
    StringBuilder runs = new StringBuilder();
    for (String problem : new String[] {"typical", "whole"}) {
      String file = PROBLEMS + problem + ".yaml";
      runs.append(line(problem, "java -jar", WholeRuns.ofJar(file)));
      runs.append(line(problem, "start script", WholeRuns.ofScript(file)));
    }
    new Section("Search and whole runs").write(text(milliseconds(results), runs.toString()));
  }

  private static Map<String, Double> milliseconds(Collection<RunResult> results) {
    Map<String, Double> times = new TreeMap<>();
    for (RunResult result : results) {
      String method = result.getPrimaryResult().getLabel();
      times.put(
          result.getParams().getParam("problem") + " " + method,
          result.getPrimaryResult().getScore());
    }
    return times;
  }

  private static String text(Map<String, Double> times, String runs) {
    StringBuilder text = new StringBuilder();
    text.append("Command: `mvn -B -ntp -P benchmark verify -DskipTests`\n\n");
    text.append("Machine: ").append(Section.machine()).append("\n\n");
    text.append("### Warm search, heap 256 MB\n\n");
    text.append("A spring computed at its loads is one state; root finding is included, and so\n");
    text.append(
        "is working out every conflict. From 500 wires on the search shares them among all\n");
    text.append(
        "processors; the scan runs on one, so that the times compare as they are felt and the\n");
    text.append("states tell the work.\n");
    text.append(
        "Typical, loose and infeasible try six common grades in the sizes they are stocked in;\n");
    text.append(
        "whole is the typical problem over every grade of the catalogue (supply any, materials\n");
    text.append(
        "all), stroke the same with the lengths left open; extension and torsion are springs of\n");
    text.append("those kinds over every grade.\n\n");
    text.append("| problem | wires | fit | candidates | search ms | scan ms | search/scan |");
    text.append(" states search | states scan | share |\n");
    text.append("|---|---|---|---|---|---|---|---|---|---|\n");
    for (String problem : SEARCHED) {
      text.append(row(problem, times));
    }
    text.append("\n### Whole runs in turns, 21 pairs, at most 256 MB of heap\n\n");
    text.append("| problem | started by | bare Java start, median ms | `shortlist`, median ms |");
    text.append(" median ratio of neighbours |\n|---|---|---|---|---|\n");
    return text.append(runs).toString();
  }

  private static String row(String problem, Map<String, Double> times) {
    Workload<?> workload = Workload.of(problem);
    var answer = workload.search();
    double search = times.get(problem + " search");
    double scan = times.get(problem + " scan");
    long searched = workload.statesOfSearch();
    long scanned = workload.statesOfScan();
    return "| "
        + String.join(
            " | ",
            problem,
            Integer.toString(workload.wires()),
            Integer.toString(answer.feasible().size()),
            Integer.toString(answer.candidates()),
            number("%.2f", search),
            number("%.2f", scan),
            number("%.2f", search / scan),
            Long.toString(searched),
            Long.toString(scanned),
            number("%.3f", (double) searched / scanned))
        + " |\n";
  }

  private static String line(String problem, String start, WholeRuns runs) {
    return "| "
        + String.join(
            " | ",
            problem,
            start,
            number("%.0f", 1000 * WholeRuns.median(runs.hello())),
            number("%.0f", 1000 * WholeRuns.median(runs.shortlist())),
            number("%.1f", runs.ratio()))
        + " |\n";
  }

  private static String number(String pattern, double value) {
    return String.format(Locale.ROOT, pattern, value);
  }
}
