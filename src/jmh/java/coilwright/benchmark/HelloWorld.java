package coilwright.benchmark;

/** The least a Java program can do: what a whole run is measured against. */
public final class HelloWorld {

  private HelloWorld() {}

  /**
   * Prints one line.
   *
   * @param args not used
   */
  public static void main(String[] args) {
    System.out.println("hello world");
  }
}
