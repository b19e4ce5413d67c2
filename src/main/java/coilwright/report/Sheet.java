package coilwright.report;

import coilwright.problem.Design;
import coilwright.problem.Problem;
import coilwright.search.Synthesis;
import coilwright.spring.State;
import java.io.IOException;
import java.util.List;
import java.util.function.Predicate;

/**
 * What is particular to one kind of spring in text, JSON and CSV.
 *
 * @param <S> the state of the kind of spring
 */
public interface Sheet<S extends State> {

  /** What is particular to it in search and check. */
  Synthesis<S> synthesis();

  /** What a problem without a title is called: "Compression spring". */
  String title();

  /**
   * An end form in words: "squared ends".
   *
   * @param endForm the id of the end form
   */
  String ends(String endForm);

  /** The values between which spring it is and what its checks come to, for JSON and CSV. */
  List<SpringPart<S>> parts(Problem problem);

  /** Adds a checked spring's numbers to a table of label, number and unit. */
  void addSpring(TextTable table, S spring, OutputUnits units);

  /** A checked spring's loads as a table. */
  TextTable loads(S spring, OutputUnits units);

  /** The columns of a list; the coils that vary along a wire first. */
  List<Column<S>> columns(Problem problem);

  /** What the heads of the columns stand for, ended by a semicolon. */
  String legend();

  /** A sentence more on the columns, begun by a blank; empty where none is needed. */
  default String remark(Problem problem) {
    return "";
  }

  /** What a reader should know of some springs. */
  List<Note<S>> notes(Problem problem);

  /** What rests on the density of its wire, in words. */
  default String restsOnDensity() {
    return "mass, cost and surge frequency rest";
  }

  /** What a reader should know of all springs of the kind. */
  default List<String> generalNotes() {
    return List.of();
  }

  /** Adds the loads as they were understood, and what they come to. */
  void understandLoads(Understood words);

  /** Adds bounds of the space that only this kind has. */
  default void understandSpace(Understood words, List<String> space) {}

  /** Adds how the ends may be made. */
  void understandEnds(Understood words);

  /** Adds what is asked of a spring to check beside the loads, the space and the limits. */
  default void understandDesign(Understood words) {}

  /** Whether a list rounds the free length to its step. */
  boolean roundsLength(Problem problem);

  /** Adds how it is held, and the limits. */
  void understandLimits(Understood words);

  /** Writes the load line of one spring. */
  void writeRequired(Json json, Problem problem) throws IOException;

  /** Writes the loads as the file gives them. */
  void writeLoads(Json json, Problem problem) throws IOException;

  /** Writes bounds of the space that only this kind has. */
  default void writeSpace(Json json, Problem problem) throws IOException {}

  /** Writes what stands at the top of the file between the space and what is made. */
  default void writeHolding(Json json, Problem problem) throws IOException {}

  /** Whether the file's step of the coil count applies, and nothing else fixes the counts. */
  default boolean stepsCoils(Problem problem) {
    return true;
  }

  /** Writes how the ends may be made. */
  void writeEnds(Json json, Problem problem) throws IOException;

  /** Writes whether it is pressed solid once before use, where it can be. */
  default void writeSetRemoved(Json json, boolean setRemoved) throws IOException {}

  /** Writes what of a checked spring is not common to all kinds. */
  void writeDesign(Json json, Design design) throws IOException;

  /** Writes the limits. */
  void writeLimits(Json json, Problem problem) throws IOException;

  /**
   * The values of a spring whose grade has no data for its wire: without a strength nothing else
   * can be judged.
   */
  List<Field<Design>> design();

  /**
   * A number of a spring under a short head.
   *
   * @param head the head
   * @param quantity the number
   * @param <S> what has it
   */
  record Column<S>(String head, Quantity<S> quantity) {}

  /**
   * Something a reader should know of the springs that it concerns.
   *
   * @param what what it is
   * @param concerns which springs
   * @param <S> the springs
   */
  record Note<S>(String what, Predicate<S> concerns) {}
}
