package coilwright.benchmark;

import coilwright.search.Answer;
import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Threads;
import org.openjdk.jmh.annotations.Warmup;

/** The warm search of the whole catalogue, and the same by scanning every coil count. */
@State(Scope.Benchmark)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MILLISECONDS)
@Warmup(iterations = 4, time = 2)
@Measurement(iterations = 5, time = 2)
@Fork(
    value = 1,
    jvmArgsAppend = {"-Xmx256m", "-XX:+UseSerialGC"})
@Threads(1)
public class SearchBenchmark {

  /** Which problem: see the comment at the head of each file. */
  @Param({"typical", "loose", "infeasible", "whole", "stroke", "extension", "torsion"})
  public String problem;

  private Workload<?> workload;

  /** Reads the problem and draws its wires. */
  @Setup
  public void prepare() {
    workload = Workload.of(problem);
  }

  /**
   * The search.
   *
   * @return its answer
   */
  @Benchmark
  public Answer<?> search() {
    return workload.search();
  }

  /**
   * The scan.
   *
   * @return how many springs hold
   */
  @Benchmark
  public int scan() {
    return workload.scan();
  }
}
