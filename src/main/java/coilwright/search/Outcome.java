package coilwright.search;

import coilwright.problem.LimitName;
import coilwright.spring.State;
import java.util.EnumSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;

/**
 * What came of one wire: candidates, or why there is none. It keeps none of the springs tried on
 * the way, so that a search of many wires needs little memory.
 *
 * @param candidates every practical coil count that holds, fewest coils first
 * @param conflict why there is no candidate, in limits that cannot hold together; empty where there
 *     is one
 * @param ruledOutBy the limits counted against the wire; none where it has a candidate
 */
record Outcome<S extends State>(
    List<Candidate<S>> candidates, Optional<Conflict> conflict, Set<LimitName> ruledOutBy) {

  /** A wire with candidates. */
  static <S extends State> Outcome<S> of(List<Candidate<S>> candidates) {
    return new Outcome<>(candidates, Optional.empty(), EnumSet.noneOf(LimitName.class));
  }

  /** A wire without one. */
  static <S extends State> Outcome<S> of(Rejection<S> rejection) {
    return new Outcome<>(List.of(), Optional.of(rejection.conflict()), rejection.ruledOutBy());
  }
}
