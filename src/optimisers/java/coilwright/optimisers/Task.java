package coilwright.optimisers;

/** Something to be made least over a few variables, each scaled to the range from 0 to 1. */
interface Task {

  /** Its name in the table. */
  String name();

  /** How large its space is, in words. */
  String space();

  /** The unit of the objective. */
  String unit();

  /** The choices of each variable; 0 for one that is continuous. */
  int[] choices();

  /**
   * The judge.
   *
   * @param shares one number from 0 to 1 for each variable; a variable with k choices cuts this
   *     range into k equal parts
   * @return its verdict
   */
  Verdict judge(double[] shares);

  /** The least objective known: what the others are measured against. */
  double best();

  /** Runs the program's own search, warm, and measures it. */
  Found search();

  /** The choice that a share stands for. */
  static int choice(double share, int choices) {
    return (int) Math.max(0, Math.min(choices - 1, Math.floor(share * choices)));
  }
}
