package coilwright.search;

import coilwright.material.Wire;
import coilwright.spring.Family;
import coilwright.spring.State;
import java.util.Optional;
import java.util.concurrent.atomic.AtomicLong;

/**
 * A family that counts the springs computed of it.
 *
 * @param family the family
 * @param count where they are counted
 * @param <S> the state of the kind of spring
 */
public record CountingFamily<S extends State>(Family<S> family, AtomicLong count)
    implements Family<S> {

  @Override
  public S at(double coils) {
    count.incrementAndGet();
    return family.at(coils);
  }

  @Override
  public Optional<S> rounded(double coils) {
    count.incrementAndGet();
    return family.rounded(coils);
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
    return family.fewestCoils();
  }

  @Override
  public double mostCoils() {
    return family.mostCoils();
  }

  @Override
  public double roundingShare(double coils) {
    return family.roundingShare(coils);
  }

  @Override
  public double play(double coils) {
    return family.play(coils);
  }

  @Override
  public Family<S> keepingNothing() {
    Family<S> other = family.keepingNothing();
    return other == family ? this : new CountingFamily<>(other, count);
  }
}
