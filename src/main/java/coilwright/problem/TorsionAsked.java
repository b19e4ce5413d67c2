package coilwright.problem;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * What a problem asks that only torsion springs have.
 *
 * @param closing whether the loads wind the spring up; else they unwind it
 * @param loads the loads as the file gives them, for the whole group
 * @param facts what else it says of the line of torque against angle, likewise for the group
 * @param line what one spring must do; empty only in a file for checking that does not fix it
 * @param legs the legs; both zero long where the file gives none
 * @param maxBodyLength greatest body length at the greatest torque [mm], or empty
 * @param bendingStress the bound on the bending stress at the greatest torque
 * @param rateConstant c of the rate per turn, E d^4/(c D n) [-]
 */
public record TorsionAsked(
    boolean closing,
    List<TorqueAsked> loads,
    TorqueFacts facts,
    Optional<TorqueLine> line,
    LegsAsked legs,
    OptionalDouble maxBodyLength,
    StressLimit bendingStress,
    double rateConstant) {

  /** Copies the list. */
  public TorsionAsked {
    loads = List.copyOf(loads);
  }
}
