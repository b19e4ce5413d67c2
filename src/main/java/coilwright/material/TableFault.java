package coilwright.material;

/** Words the one exception that a bad catalogue file causes. */
final class TableFault {

  private TableFault() {}

  /**
   * A fault at a cell.
   *
   * @param file name of the file
   * @param line line in it, from 1
   * @param column name of the column
   * @param why what was found and what is accepted
   * @return the exception, to be thrown
   */
  static IllegalStateException at(String file, int line, String column, String why) {
    return new IllegalStateException(
        "catalogue file " + file + ", line " + line + ", column " + column + ": " + why);
  }

  /**
   * A fault of a header line or of a whole file.
   *
   * @param file name of the file
   * @param line line in it, from 1
   * @param why what was found and what is accepted
   * @return the exception, to be thrown
   */
  static IllegalStateException at(String file, int line, String why) {
    return new IllegalStateException("catalogue file " + file + ", line " + line + ": " + why);
  }
}
