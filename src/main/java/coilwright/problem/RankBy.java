package coilwright.problem;

/** What a shortlist is ordered by. */
public enum RankBy {
  /** Lightest first. */
  MASS("mass"),
  /** Greatest least stress margin first. */
  MARGIN("margin"),
  /** Lowest cost proxy first. */
  COST("cost"),
  /** Greatest margin of the limiting check first. */
  ROBUST("robust");

  private final String id;

  RankBy(String id) {
    this.id = id;
  }

  /** The id used in problem files and options. */
  public String id() {
    return id;
  }
}
