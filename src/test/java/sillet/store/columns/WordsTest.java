package sillet.store.columns;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import sillet.acoustics.readings.Reference;
import sillet.acoustics.wire.Construction;
import sillet.logbook.moves.Verdict;

class WordsTest {
  static Iterable<Words<?>> all() {
    return Words.all();
  }

  @ParameterizedTest
  @MethodSource("all")
  void readsEveryWordItWrites(Words<?> words) {
    readsBack(words);
  }

  private static <E extends Enum<E>> void readsBack(Words<E> words) {
    for (E one : words.type().getEnumConstants()) {
      assertThat(words.read(words.write(one))).isEqualTo(one);
      assertThat(words.write(one)).matches("[a-z0-9-]{1,40}");
    }
  }

  @Test
  void writesTheWordsOfTheFiles() {
    assertThat(Words.of(Construction.class).write(Construction.WOUND_NICKEL))
        .isEqualTo("wound-nickel");
    assertThat(Words.of(Reference.class).write(Reference.HARMONIC)).isEqualTo("harmonic");
  }

  @Test
  void refusesAWordItDoesNotKnowAndAKindThatIsNotStored() {
    assertThatIllegalArgumentException()
        .isThrownBy(() -> Words.of(Construction.class).read("wound-gold"));
    assertThatIllegalArgumentException().isThrownBy(() -> Words.of(Verdict.class));
  }
}
