package coilwright.search;

import coilwright.limit.CoilSet;
import coilwright.material.Wire;
import coilwright.problem.LimitName;
import java.util.EnumSet;
import java.util.List;
import java.util.Set;

/**
 * Why a wire has no candidate: limits that cannot hold together, each with the coil counts it
 * leaves.
 *
 * @param wire the wire
 * @param endForm how the ends would be formed
 * @param parts the limits, in the order of their names
 */
public record Conflict(Wire wire, String endForm, List<Part> parts) {

  /** Copies the list. */
  public Conflict {
    parts = List.copyOf(parts);
  }

  /**
   * One limit of a conflict.
   *
   * @param limit its name
   * @param coils the coil counts it leaves, unrounded
   */
  public record Part(LimitName limit, CoilSet coils) {}

  /** The names of its limits. */
  public Set<LimitName> limits() {
    return names(parts);
  }

  /** The names in a list of parts. */
  static Set<LimitName> names(List<Part> parts) {
    Set<LimitName> names = EnumSet.noneOf(LimitName.class);
    parts.forEach(part -> names.add(part.limit()));
    return names;
  }
}
