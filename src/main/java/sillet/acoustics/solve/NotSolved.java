package sillet.acoustics.solve;

import java.util.function.Function;

/**
 * There is no answer for these data.
 *
 * @param because what stood in the way, in a few words and without a full stop
 */
public record NotSolved<T>(String because) implements Outcome<T> {

  @Override
  public <R> Outcome<R> flatMap(Function<? super T, Outcome<R>> next) {
    return new NotSolved<>(because);
  }

  @Override
  public T orElseThrow() {
    throw new IllegalStateException(because);
  }
}
