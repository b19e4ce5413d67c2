package coilwright.material;

import coilwright.source.Evidence;

/** What a grade's wire may differ from its nominal diameter by. */
public interface ToleranceLaw {

  /**
   * The permissible variation, either way.
   *
   * @param diameter nominal wire diameter d [mm]
   * @return what the wire may be thicker or thinner by [mm]; positive
   * @throws IllegalArgumentException if the diameter is not positive and finite
   */
  double at(double diameter);

  /**
   * Whether the variation at a diameter was seen or is remembered.
   *
   * @param diameter nominal wire diameter d [mm]
   * @return {@link Evidence#MEMORY} also where no publication was seen that gives it for the grade
   */
  Evidence evidenceAt(double diameter);
}
