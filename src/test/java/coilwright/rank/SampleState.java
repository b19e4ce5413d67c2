package coilwright.rank;

import coilwright.material.Wire;
import coilwright.material.WireSize;
import coilwright.search.Candidate;
import coilwright.search.GradeDraft;
import coilwright.spring.State;
import java.util.ArrayList;
import java.util.List;

/**
 * No spring but what a list asks of one. Its wire may differ from its diameter by 0.02 mm.
 *
 * @param wire its wire
 * @param endForm its ends
 * @param coils its active coils
 */
record SampleState(Wire wire, String endForm, double coils) implements State {

  /** The springs of a list, best first, each written "steel-a 1.4 squared 8". */
  static List<Ranked<SampleState>> list(String... springs) {
    List<Candidate<SampleState>> list = new ArrayList<>();
    for (String spring : springs) {
      String[] words = spring.split(" ");
      WireSize size = WireSize.explicit(words[1], Double.parseDouble(words[1]));
      Wire wire = GradeDraft.of(words[0], 2000).grade().drawnTo(size);
      list.add(
          new Candidate<>(
              new SampleState(wire, words[2], Double.parseDouble(words[3])), List.of()));
    }
    return Ranked.of(list);
  }

  @Override
  public boolean ground() {
    return false;
  }

  @Override
  public double mass() {
    return 1;
  }

  @Override
  public double wireLength() {
    return 1;
  }
}
