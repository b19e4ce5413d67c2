package coilwright.spring;

/** What is done to the ends of a spring after coiling. */
public enum EndWork {
  /** Nothing, though they might be ground. */
  NONE("grinding"),
  /** Both are ground flat. */
  GRINDING("grinding"),
  /** Both are bent up into hooks. */
  HOOK_FORMING("hook forming"),
  /** Both are straightened or bent into legs. */
  LEG_FORMING("leg forming"),
  /** Nothing, though legs might be formed. */
  NO_LEGS("leg forming");

  private final String words;

  EndWork(String words) {
    this.words = words;
  }

  /** The operation in words. */
  public String words() {
    return words;
  }
}
