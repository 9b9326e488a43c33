package sillet.acoustics.solve;

import java.util.function.Function;

/**
 * The answer of a computation whose data may be impossible: either {@link Solved} or {@link
 * NotSolved} with the reason.
 *
 * @param <T> what is computed
 */
public sealed interface Outcome<T> permits Solved, NotSolved {

  /** An answer that was found. */
  static <T> Outcome<T> solved(T value) {
    return new Solved<>(value);
  }

  /** No answer; {@code because} says in a few words what stood in the way. */
  static <T> Outcome<T> notSolved(String because) {
    return new NotSolved<>(because);
  }

  /** The answer carried on by {@code next}; a failure stays the failure it is. */
  default <R> Outcome<R> map(Function<? super T, ? extends R> next) {
    return flatMap(value -> solved(next.apply(value)));
  }

  /** The answer carried on by {@code next}, which may fail in its turn. */
  <R> Outcome<R> flatMap(Function<? super T, Outcome<R>> next);

  /**
   * The answer, for callers who know that there is one.
   *
   * @throws IllegalStateException with the reason, when there is none
   */
  T orElseThrow();
}
