package coilwright.optimisers;

import java.lang.management.ManagementFactory;
import java.lang.management.ThreadMXBean;

/** The processor time of this thread: what else the machine does leaves it nearly alone. */
final class Clock {

  private static final ThreadMXBean THREADS = ManagementFactory.getThreadMXBean();
  private static final double NANO = 1e-9;

  private Clock() {}

  /** Seconds this thread has worked. */
  static double seconds() {
    return NANO * THREADS.getCurrentThreadCpuTime();
  }
}
