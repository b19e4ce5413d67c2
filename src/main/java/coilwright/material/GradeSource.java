package coilwright.material;

import coilwright.source.Evidence;

/**
 * Where one kind of a grade's data comes from.
 *
 * @param what the kind: "strength", "moduli", "density", "service temperature", "cost index"
 * @param text the publication and the place in it
 * @param evidence seen or memory
 */
public record GradeSource(String what, String text, Evidence evidence) {}
