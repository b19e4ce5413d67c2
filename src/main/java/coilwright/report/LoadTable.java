package coilwright.report;

import java.util.ArrayList;
import java.util.List;

/**
 * The loads of a checked spring as a table: one row a load.
 *
 * @param <T> a load
 */
final class LoadTable<T> {

  private final List<Quantity<T>> quantities;
  private final OutputUnits units;
  private final TextTable table;

  LoadTable(List<Quantity<T>> quantities, OutputUnits units) {
    this.quantities = quantities;
    this.units = units;
    this.table = new TextTable("l" + "r".repeat(quantities.size()));
    List<String> head = new ArrayList<>(List.of(""));
    for (Quantity<T> quantity : quantities) {
      head.add(quantity.label() + " " + units.symbol(quantity.dimension()));
    }
    table.row(head.toArray(String[]::new));
  }

  /** Adds the loads asked, numbered. */
  LoadTable<T> addAll(List<T> loads) {
    for (int i = 0; i < loads.size(); i++) {
      add("load " + (i + 1), loads.get(i));
    }
    return this;
  }

  /** Adds a load. */
  LoadTable<T> add(String name, T load) {
    List<String> cells = new ArrayList<>(List.of(name));
    for (Quantity<T> quantity : quantities) {
      cells.add(quantity.text(load, units));
    }
    table.row(cells.toArray(String[]::new));
    return this;
  }

  /** The table. */
  TextTable table() {
    return table;
  }
}
