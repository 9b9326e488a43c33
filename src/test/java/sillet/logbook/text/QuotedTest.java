package sillet.logbook.text;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;

class QuotedTest {
  @Test
  void repeatsAtMostFortyCharacters() {
    assertThat(Quoted.of("a".repeat(40))).isEqualTo("a".repeat(40));
    assertThat(Quoted.of("a".repeat(41))).isEqualTo("a".repeat(40) + "...");
  }

  @Test
  void showsControlCharactersAsSuch() {
    assertThat(Quoted.of("a\u0000b\nc\u202ed")).isEqualTo("a\\u0000b\\u000ac\\u202ed");
  }

  @Test
  void cutsNoCharacterInTwo() {
    String guitars = "\uD83C\uDFB8".repeat(50);
    assertThat(Quoted.of(guitars)).isEqualTo("\uD83C\uDFB8".repeat(40) + "...");
  }
}
