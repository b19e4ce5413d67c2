package coilwright.cli;

import coilwright.material.Catalogue;
import coilwright.problem.Problem;
import coilwright.problem.ProblemReader;
import coilwright.problem.Purpose;
import coilwright.problem.RankBy;
import coilwright.rank.Order;
import coilwright.report.Shortlist;
import coilwright.report.ShortlistText;
import coilwright.search.Answer;
import coilwright.search.CompressionSearch;
import coilwright.search.WireChoice;
import coilwright.spring.CompressionState;
import java.nio.charset.StandardCharsets;
import java.util.Optional;

/**
 * Readies the classes of a search in a second thread while the command line is being read: most of
 * a short run goes into loading classes and running them cold. It solves a small problem of its own
 * and throws the answer away, so that it can change no result; it is awaited before the real
 * problem is read, so that no two threads ever meet.
 */
final class HeadStart {

  private static final String SMALL_PROBLEM =
      """
      spring: compression
      loads: [{length: 32 mm, force: 18 N}, {length: 22 mm, force: 45 N}]
      envelope: {bore: 16 mm, rod: 8 mm, diametral_clearance: 0.5 mm}
      make: {materials: [en-10270-1-sm], wire_sizes: [0.8 mm, 1.2 mm, 1.3 mm, 1.4 mm, 1.6 mm, 2 mm]}
      """;

  private final Optional<Thread> thread;

  private HeadStart(Optional<Thread> thread) {
    this.thread = thread;
  }

  /** No head start. */
  static HeadStart none() {
    return new HeadStart(Optional.empty());
  }

  /** Begins one, where the arguments name a command that searches or checks. */
  static HeadStart forArguments(String... args) {
    if (args.length < 2 || !args[0].equals("shortlist") && !args[0].equals("check")) {
      return none();
    }
    Thread thread = new Thread(HeadStart::solveSmallProblem, "head start");
    thread.setDaemon(true);
    // Whatever fails here fails again in the run itself, which can tell the user.
    thread.setUncaughtExceptionHandler((failed, problem) -> {});
    thread.start();
    return new HeadStart(Optional.of(thread));
  }

  /** Waits until it is over. */
  void await() {
    try {
      if (thread.isPresent()) {
        thread.get().join();
      }
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
    }
  }

  private static void solveSmallProblem() {
    Catalogue catalogue = Catalogue.load();
    byte[] bytes = SMALL_PROBLEM.getBytes(StandardCharsets.UTF_8);
    ProblemReader.read(bytes, Purpose.SHORTLIST, catalogue)
        .problem()
        .ifPresent(problem -> solve(problem, catalogue));
  }

  private static void solve(Problem problem, Catalogue catalogue) {
    WireChoice choice = WireChoice.of(problem, catalogue);
    Answer<CompressionState> answer = CompressionSearch.run(problem, choice);
    ShortlistText.of(
        new Shortlist(problem, choice, answer, false, Order.ranked(answer, RankBy.MASS, false)));
  }
}
