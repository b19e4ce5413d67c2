package coilwright.source;

/**
 * A place in a publication, and whether it was seen there.
 *
 * @param source the publication
 * @param locator the clause, table, equation or page; may be empty for a whole publication
 * @param evidence whether the place was seen or is remembered
 */
public record Citation(Source source, String locator, Evidence evidence) {

  /**
   * A place remembered, not seen: the usual case for a clause number, while the formula itself is
   * held by tests against published values.
   *
   * @param source the publication
   * @param locator the clause, table, equation or page
   * @return the citation, marked {@link Evidence#MEMORY}
   */
  public static Citation remembered(Source source, String locator) {
    return new Citation(source, locator, Evidence.MEMORY);
  }

  /**
   * A place seen.
   *
   * @param source the publication
   * @param locator the clause, table, equation or page
   * @return the citation, marked {@link Evidence#SEEN}
   */
  public static Citation seen(Source source, String locator) {
    return new Citation(source, locator, Evidence.SEEN);
  }

  /** The place in one line: short title, then locator. */
  public String place() {
    return locator.isEmpty() ? source.shortTitle() : source.shortTitle() + ", " + locator;
  }

  /** The place, marked where it is from memory. */
  public String text() {
    return evidence == Evidence.MEMORY ? place() + " (from memory)" : place();
  }
}
