package coilwright.limit;

import coilwright.problem.LimitName;
import coilwright.source.Citation;
import coilwright.source.Source;
import coilwright.spring.ExtensionState;
import coilwright.spring.Family;
import coilwright.spring.InitialTension;
import coilwright.unit.Dimension;

/**
 * The initial tension against what close-wound coils can have.
 *
 * @param end which bound is held
 */
record TensionBound(End end) implements Limit<ExtensionState> {

  /** The bounds. */
  enum End {
    /** No coil pushes: a fact that stays whatever a file says. */
    NOT_NEGATIVE(Side.MIN, "zero or more, for coils that touch cannot pull each other closer"),
    /** Less is hard to hold evenly. */
    LEAST_PREFERRED(Side.MIN, preferred()),
    /** More needs special coiling. */
    GREATEST_PREFERRED(Side.MAX, preferred());

    private final Check check;

    End(Side side, String definition) {
      this.check = new Check(LimitName.INITIAL_TENSION, side, Dimension.FORCE, definition);
    }

    private static String preferred() {
      return "against the preferred range for the index, " + InitialTension.USUAL.author();
    }
  }

  private static final Citation STATICS =
      Citation.seen(Source.FIRST_PRINCIPLES, "coils that touch can only press on each other");

  @Override
  public Check check() {
    return end.check;
  }

  @Override
  public boolean removable() {
    return end != End.NOT_NEGATIVE;
  }

  @Override
  public Finding judge(ExtensionState state) {
    Citation source = removable() ? InitialTension.USUAL.citation() : STATICS;
    return Finding.of(end.check, state.initialTension(), bound(state), source);
  }

  private double bound(ExtensionState state) {
    return switch (end) {
      case NOT_NEGATIVE -> 0;
      case LEAST_PREFERRED -> state.leastPreferred(InitialTension.USUAL);
      case GREATEST_PREFERRED -> state.greatestPreferred(InitialTension.USUAL);
    };
  }

  @Override
  public double[] turns(Family<ExtensionState> family) {
    AlongExtension along = new AlongExtension(family);
    return switch (end) {
      case NOT_NEGATIVE -> along.turnsOfFreeLength();
      case LEAST_PREFERRED -> along.turnsOfTension(true);
      case GREATEST_PREFERRED -> along.turnsOfTension(false);
    };
  }

  /** {@inheritDoc} It is the difference of a load and what the rate gives, and far smaller. */
  @Override
  public double sensitivity(ExtensionState state) {
    double bound = bound(state);
    return bound > 0 ? Math.max(1, state.greatestForce() / bound) : state.greatestForce();
  }
}
