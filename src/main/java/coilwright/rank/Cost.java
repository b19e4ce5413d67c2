package coilwright.rank;

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
 * @param grinding cost of grinding the ends; 0 where they are not ground
 */
public record Cost(double wire, double coiling, double stressRelief, double grinding) {

  /** Wire lost at cut-off, as a share of the wire in the spring. Common practice, no source. */
  public static final double END_SCRAP = 0.03;

  /** Coiling, as a share of the wire's cost. Common practice, no source. */
  public static final double COILING = 0.30;

  /** Heat treatment, as a share of the wire's cost. Common practice, no source. */
  public static final double STRESS_RELIEF = 0.05;

  /** Grinding both ends, as a share of the wire's cost. Common practice, no source. */
  public static final double GRINDING = 0.25;

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
        wire, COILING * wire, STRESS_RELIEF * wire, state.ground() ? GRINDING * wire : 0);
  }

  /** The sum of the terms [g of hard-drawn wire]. */
  public double total() {
    return wire + coiling + stressRelief + grinding;
  }

  /** The terms, the wire first. */
  public List<Term> terms() {
    return List.of(
        new Term("wire with end scrap", wire),
        new Term("coiling", coiling),
        new Term("stress relief", stressRelief),
        new Term("grinding", grinding));
  }
}
