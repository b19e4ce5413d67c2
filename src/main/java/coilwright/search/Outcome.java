package coilwright.search;

import coilwright.problem.LimitName;
import coilwright.spring.State;
import java.util.EnumSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;

/**
 * What came of one wire: candidates, or why there is none.
 *
 * @param candidates every practical coil count that holds, fewest coils first
 * @param rejection why there is none; empty where there is one
 */
record Outcome<S extends State>(List<Candidate<S>> candidates, Optional<Rejection<S>> rejection) {

  /** Why there is no candidate, in limits that cannot hold together; empty where there is one. */
  Optional<Conflict> conflict() {
    return rejection.map(Rejection::conflict);
  }

  /** The limits counted against the wire where it has no candidate. */
  Set<LimitName> ruledOutBy() {
    return rejection.map(Rejection::ruledOutBy).orElseGet(() -> EnumSet.noneOf(LimitName.class));
  }
}
