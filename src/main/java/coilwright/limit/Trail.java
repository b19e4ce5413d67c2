package coilwright.limit;

import coilwright.material.Wire;
import coilwright.spring.Family;
import coilwright.spring.State;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;

/**
 * A family that remembers the unrounded springs already computed: one limit's search for its bound
 * leaves states from which the next limit's starts.
 *
 * @param <S> the state of the kind of spring
 */
public final class Trail<S extends State> implements Family<S> {

  private static final int ROOM = 64;

  private final Family<S> family;
  private final double fewest;
  private final double most;
  private final List<S> states = new ArrayList<>(ROOM);
  private double[] counts = new double[ROOM];
  private Limit<S> asked;
  private double[] turns;

  /**
   * Begins a trail with the two ends of a family.
   *
   * @param family the family
   */
  public Trail(Family<S> family) {
    this.family = family;
    this.fewest = family.fewestCoils();
    this.most = family.mostCoils();
    at(fewest);
    at(most);
  }

  @Override
  public S at(double coils) {
    int index = Arrays.binarySearch(counts, 0, states.size(), coils);
    if (index < 0) {
      index = -index - 1;
      insert(index, coils);
    }
    return states.get(index);
  }

  private void insert(int index, double coils) {
    if (states.size() == counts.length) {
      counts = Arrays.copyOf(counts, 2 * counts.length);
    }
    System.arraycopy(counts, index, counts, index + 1, states.size() - index);
    counts[index] = coils;
    states.add(index, family.at(coils));
  }

  /** How many springs were computed. */
  public int size() {
    return states.size();
  }

  /** The springs computed so far, by rising coil count. */
  public List<S> states() {
    return states;
  }

  /**
   * The counts at which a limit's margin may turn along the family; those of the limit asked last
   * are remembered.
   *
   * @param limit the limit
   * @return the counts [-], not to be changed
   */
  public double[] turnsOf(Limit<S> limit) {
    if (limit != asked) {
      asked = limit;
      turns = limit.turns(this);
    }
    return turns;
  }

  /** Where a count already computed stands among them. */
  int indexOf(double coils) {
    return Arrays.binarySearch(counts, 0, states.size(), coils);
  }

  /** The coil count of a spring already computed. */
  double countAt(int index) {
    return counts[index];
  }

  @Override
  public Wire wire() {
    return family.wire();
  }

  @Override
  public String endForm() {
    return family.endForm();
  }

  @Override
  public double fewestCoils() {
    return fewest;
  }

  @Override
  public double mostCoils() {
    return most;
  }

  @Override
  public Optional<S> rounded(double coils) {
    return family.rounded(coils);
  }

  @Override
  public double roundingShare(double coils) {
    return family.roundingShare(coils);
  }

  @Override
  public double play(double coils) {
    return family.play(coils);
  }
}
