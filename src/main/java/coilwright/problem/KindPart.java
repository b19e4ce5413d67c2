package coilwright.problem;

import coilwright.spring.Seating;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * What of a problem is read by the kind of spring.
 *
 * @param facts what the file says about the load line
 * @param required what one compression spring must do
 * @param overtravel a length it must survive beyond its loads [mm]
 * @param seats how its ends are held
 * @param design the spring to check
 * @param extension what only extension springs have
 * @param torsion what only torsion springs have
 */
record KindPart(
    LoadFacts facts,
    Optional<Requirement> required,
    OptionalDouble overtravel,
    Optional<Seating> seats,
    Optional<Design> design,
    Optional<ExtensionAsked> extension,
    Optional<TorsionAsked> torsion) {}
