package coilwright.unit;

import java.util.List;

/** Lists of words in running text. */
public final class Words {

  private Words() {}

  /**
   * Words of which one may be chosen: "mm, cm or m".
   *
   * @param words one or more
   * @return the list in running text
   */
  public static String either(List<String> words) {
    int last = words.size() - 1;
    return last == 0
        ? words.get(0)
        : String.join(", ", words.subList(0, last)) + " or " + words.get(last);
  }
}
