package coilwright.limit;

import coilwright.spring.State;
import org.apache.commons.math3.analysis.solvers.PegasusSolver;

/**
 * Two coil counts of a family, of which one holds a limit and the other does not, with one bound
 * between them.
 *
 * <p>Along a family nearly every number is nearly a power of the coil count, so the logarithm of
 * value over bound is solved against the logarithm of the count: there it is nearly a straight
 * line. A limit that is {@link Limit#straight} is solved as it is.
 */
final class Bracket<S extends State> {

  /** Of a coil count, as a share: a tenth of what a margin may fall short and still hold. */
  private static final double ACCURACY = 1e-10;

  /** Ratios of value and bound beyond this say only on which side they are. */
  private static final double WIDEST = 30;

  /** Margins below this, without end where a coil is wound off, say only on which side they are. */
  private static final double FARTHEST_OUT = -1e6;

  private static final int MOST_EVALUATIONS = 200;

  private final Limit<S> limit;
  private final Trail<S> trail;
  private final double from;
  private final double to;
  private final boolean straight;

  Bracket(Limit<S> limit, Trail<S> trail, double from, double to) {
    this.limit = limit;
    this.trail = trail;
    this.from = from;
    this.to = to;
    this.straight = limit.straight();
  }

  /** The coil count at which the limit begins or ceases to hold. */
  double root() {
    double low = scale(from);
    double high = scale(to);
    double atLow = excess(from);
    double atHigh = excess(to);
    if (!(high - low > ACCURACY) || !(atLow * atHigh < 0)) {
      return Math.abs(atLow) < Math.abs(atHigh) ? from : to;
    }
    return coils(
        new PegasusSolver(ACCURACY, ACCURACY, ACCURACY)
            .solve(
                MOST_EVALUATIONS,
                x -> x == low ? atLow : x == high ? atHigh : excess(coils(x)),
                low,
                high));
  }

  private double scale(double coils) {
    return straight ? coils : StrictMath.log(coils);
  }

  private double coils(double scaled) {
    double coils = straight ? scaled : StrictMath.exp(scaled);
    return Math.min(to, Math.max(from, coils));
  }

  /** Zero just where {@link Finding#holds} turns, negative where it does not hold. */
  private double excess(double coils) {
    Finding finding = limit.judge(trail.at(coils));
    if (straight || !finding.canFail() || !(finding.bound() > 0)) {
      return Math.max(FARTHEST_OUT, Math.min(finding.margin(), WIDEST)) + Finding.TOLERANCE;
    }
    double ratio = Math.min(WIDEST, Math.max(1 / WIDEST, finding.value() / finding.bound()));
    double log = StrictMath.log(ratio);
    return (finding.check().side() == Side.MIN ? log : -log) + Finding.TOLERANCE;
  }
}
