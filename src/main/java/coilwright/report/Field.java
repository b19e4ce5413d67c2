package coilwright.report;

import java.io.IOException;

/**
 * One value of a subject, declared once for JSON and CSV.
 *
 * @param <T> what has the value
 */
interface Field<T> {

  /** The name, with the unit it is in where it has one. */
  String key(OutputUnits units);

  /** Writes the value under its key; leaves it out where it does not apply. */
  void writeTo(Json json, T subject) throws IOException;

  /** The value as a cell of CSV; empty where it does not apply. */
  String cell(T subject, OutputUnits units);
}
