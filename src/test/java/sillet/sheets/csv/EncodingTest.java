package sillet.sheets.csv;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class EncodingTest {
  private static final String SHEET = "name,cents\nM\u00fcller \ud834\udd1e,3.1\n";

  @TempDir Path folder;

  @Test
  void readsUtf8AndUtf16ByTheirMarks() throws IOException {
    List<List<String>> plain = Reading.of(folder, SHEET).rows;

    assertThat(plain.get(1)).containsExactly("M\u00fcller \ud834\udd1e", "3.1");
    assertThat(Reading.of(folder, '\ufeff' + SHEET).rows).isEqualTo(plain);
    assertThat(Reading.of(folder, '\ufeff' + SHEET, StandardCharsets.UTF_16LE).rows)
        .isEqualTo(plain);
    assertThat(Reading.of(folder, '\ufeff' + SHEET, StandardCharsets.UTF_16BE).rows)
        .isEqualTo(plain);
  }

  @Test
  void namesUtf16WithoutAMark() throws IOException {
    for (var charset : List.of(StandardCharsets.UTF_16LE, StandardCharsets.UTF_16BE)) {
      Reading reading = Reading.of(folder, SHEET, charset);

      assertThat(reading.keys()).containsExactly("sheet.utf16-unmarked");
      assertThat(reading.said.get(0).place().line()).isEqualTo(1);
    }
  }

  @Test
  void refusesHalfACharacterAtTheEnd() throws IOException {
    byte[] cut = {'a', ',', 'b', '\n', '1', (byte) 0xC3};

    Reading reading = Reading.of(folder, cut);

    assertThat(reading.keys()).containsExactly("sheet.not-utf8");
    assertThat(reading.said.get(0).place()).isEqualTo(Place.character(2, 2));
  }

  @Test
  void findsABadByteWhereverTheChunksFall() throws IOException {
    String before = "x,y\n".repeat((1 << 14) - 1) + "ab";
    for (int shift = 0; shift < 5; shift++) {
      byte[] bytes = (before + "c".repeat(shift) + "?").getBytes(StandardCharsets.UTF_8);
      bytes[bytes.length - 1] = (byte) 0xE4;

      Reading reading = Reading.of(folder, bytes);

      assertThat(reading.said.get(0).place()).isEqualTo(Place.character(1 << 14, 3 + shift));
    }
  }

  @Test
  void endsInOneSentenceOnRandomBytes() throws IOException {
    Random random = new Random(20);
    for (int i = 0; i < 50; i++) {
      byte[] bytes = new byte[5000];
      random.nextBytes(bytes);

      assertThat(Reading.of(folder, bytes).keys())
          .last()
          .isIn("sheet.not-utf8", "sheet.no-text", "sheet.quote-open");
    }
  }
}
