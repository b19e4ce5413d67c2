package coilwright.rank;

import coilwright.spring.EndWork;
import coilwright.spring.State;
import java.util.List;

/**
 * A proxy for what a spring costs, in grams of hard-drawn wire: the wire it takes, end scrap
 * included, at its material's cost index, and a share of that for each operation. It ranks springs
 * of one job; it is no price.
 *
 * @param wire cost of the wire [g of hard-drawn wire]
 * @param coiling cost of coiling
 * @param stressRelief cost of heat treatment after coiling
 * @param endWork what is done to the ends
 * @param ends cost of that; 0 where nothing is done
 */
public record Cost(double wire, double coiling, double stressRelief, EndWork endWork, double ends) {

  /** Wire lost at cut-off, as a share of the wire in the spring. Common practice, no source. */
  public static final double END_SCRAP = 0.03;

  /** Coiling, as a share of the wire's cost. Common practice, no source. */
  public static final double COILING = 0.30;

  /** Heat treatment, as a share of the wire's cost. Common practice, no source. */
  public static final double STRESS_RELIEF = 0.05;

  /** Grinding both ends, as a share of the wire's cost. Common practice, no source. */
  public static final double GRINDING = 0.25;

  /** Bending up both hooks, as a share of the wire's cost. Common practice, no source. */
  public static final double HOOK_FORMING = 0.40;

  /** Forming both legs, as a share of the wire's cost. Common practice, no source. */
  public static final double LEG_FORMING = 0.20;

  private static final double GRAM_PER_KG = 1000;

  /**
   * One term of the cost.
   *
   * @param name what it pays for
   * @param value [g of hard-drawn wire]
   */
  public record Term(String name, double value) {}

  /**
   * The cost of a spring.
   *
   * @param state the spring
   * @return its cost
   */
  public static Cost of(State state) {
    double wire = state.wire().grade().costIndex() * state.mass() * GRAM_PER_KG * (1 + END_SCRAP);
    return new Cost(
        wire, COILING * wire, STRESS_RELIEF * wire, state.endWork(), share(state.endWork()) * wire);
  }

  private static double share(EndWork work) {
    return switch (work) {
      case NONE, NO_LEGS -> 0;
      case GRINDING -> GRINDING;
      case HOOK_FORMING -> HOOK_FORMING;
      case LEG_FORMING -> LEG_FORMING;
    };
  }

  /** The sum of the terms [g of hard-drawn wire]. */
  public double total() {
    return wire + coiling + stressRelief + ends;
  }

  /** The terms, the wire first. */
  public List<Term> terms() {
    return List.of(
        new Term("wire with end scrap", wire),
        new Term("coiling", coiling),
        new Term("stress relief", stressRelief),
        new Term(endWork.words(), ends));
  }
}
