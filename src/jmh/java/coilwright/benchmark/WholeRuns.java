package coilwright.benchmark;

import java.io.File;
import java.io.IOException;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/**
 * Whole runs of the program and of a bare Java start, in turns.
 *
 * @param hello seconds of each bare start
 * @param shortlist seconds of each run of the program
 */
record WholeRuns(double[] hello, double[] shortlist) {

  private static final int ROUNDS = 21;
  private static final String JAVA =
      System.getProperty("java.home") + File.separator + "bin" + File.separator + "java";

  /** The program as `java -jar` starts it, against a bare Java start. */
  static WholeRuns ofJar(String problemFile) throws IOException, InterruptedException {
    return inTurns(
        List.of(JAVA, "-Xmx256m", "-jar", "target/coilwright.jar", "shortlist", problemFile));
  }

  /** The program as its start script starts it, against a bare Java start. */
  static WholeRuns ofScript(String problemFile) throws IOException, InterruptedException {
    return inTurns(List.of("target/coilwright", "shortlist", problemFile));
  }

  /** Runs both in turns; the first round warms the file cache and does not count. */
  private static WholeRuns inTurns(List<String> shortlist)
      throws IOException, InterruptedException {
    List<String> hello = List.of(JAVA, "-cp", "target/test-classes", HelloWorld.class.getName());
    double[] first = new double[ROUNDS];
    double[] second = new double[ROUNDS];
    for (int i = -1; i < ROUNDS; i++) {
      double one = seconds(hello);
      double two = seconds(shortlist);
      if (i >= 0) {
        first[i] = one;
        second[i] = two;
      }
    }
    return new WholeRuns(first, second);
  }

  private static double seconds(List<String> command) throws IOException, InterruptedException {
    ProcessBuilder process =
        new ProcessBuilder(new ArrayList<>(command))
            .redirectOutput(ProcessBuilder.Redirect.DISCARD)
            .redirectError(ProcessBuilder.Redirect.DISCARD);
    long start = System.nanoTime();
    int status = process.start().waitFor();
    double seconds = (System.nanoTime() - start) / 1e9;
    if (status != 0) {
      throw new IllegalStateException(command + " ended with status " + status);
    }
    return seconds;
  }

  /** The median of the ratios of neighbouring runs. */
  double ratio() {
    double[] ratios = new double[ROUNDS];
    for (int i = 0; i < ROUNDS; i++) {
      ratios[i] = shortlist[i] / hello[i];
    }
    return median(ratios);
  }

  /** The median. */
  static double median(double[] values) {
    double[] sorted = values.clone();
    Arrays.sort(sorted);
    return sorted[sorted.length / 2];
  }
}
