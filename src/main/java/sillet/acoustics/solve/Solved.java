package sillet.acoustics.solve;

import java.util.function.Function;

/**
 * An answer that was found.
 *
 * @param value the answer, in the unit of the computation that gave it
 */
public record Solved<T>(T value) implements Outcome<T> {

  @Override
  public <R> Outcome<R> flatMap(Function<? super T, Outcome<R>> next) {
    return next.apply(value);
  }

  @Override
  public T orElseThrow() {
    return value;
  }
}
