package coilwright.problem;

/** What a problem file is read for. */
public enum Purpose {
  /** A search: the file may have a {@code make} block and must fix the load line. */
  SHORTLIST,
  /** A check: the file has a {@code design} block. */
  CHECK
}
