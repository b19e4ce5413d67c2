package coilwright.search;

import coilwright.problem.LimitName;
import coilwright.spring.State;
import java.util.List;
import java.util.Optional;
import java.util.Set;

/**
 * What came of one wire: candidates, or why there is none.
 *
 * @param candidates every practical coil count that holds, fewest coils first
 * @param conflict why there is none; empty where there is one
 * @param ruledOutBy the limits counted against the wire where it has no candidate
 */
record Outcome<S extends State>(
    List<Candidate<S>> candidates, Optional<Conflict> conflict, Set<LimitName> ruledOutBy) {}
