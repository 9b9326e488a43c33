package sillet.sheets.csv;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.io.StringWriter;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** What is written is read back as it was, with the characters that break careless writers. */
class RoundTripTest {
  private static final String[] PARTS = {
    "\\", "\"", "\r", "\n", "\r\n", ";", ",", "'", "=", "-", "+", "@", "\t", "a", "b c", "\u00e9",
    "\ufeff", " "
  };

  @TempDir Path folder;

  @Test
  void bringsBackWordsWithLineBreaksAsLineFeeds() throws IOException {
    Random random = new Random(4180);
    for (int run = 0; run < 300; run++) {
      List<String> words = words(random);
      CsvLine line = new CsvLine();
      words.forEach(line::word);

      List<List<String>> rows = Reading.of(folder, "a,b,c,d,e\n" + written(line)).rows;

      assertThat(padded(rows))
          .as("run %d: %s", run, words)
          .isEqualTo(words.stream().map(w -> w.replaceAll("\r\n|\r", "\n").strip()).toList());
    }
  }

  @Test
  void bringsBackGuardedTextOnOneLine() throws IOException {
    Random random = new Random(1236);
    for (int run = 0; run < 300; run++) {
      List<String> texts = words(random);
      CsvLine line = new CsvLine();
      texts.forEach(line::text);
      String written = written(line);

      List<String> read =
          padded(Reading.of(folder, "a,b,c,d,e\n" + written).rows).stream()
              .map(Guard::off)
              .toList();

      assertThat(written).as("run %d", run).hasLineCount(1);
      assertThat(read)
          .as("run %d: %s", run, texts)
          .isEqualTo(texts.stream().map(t -> t.replaceAll("[\r\n\t]", " ").strip()).toList());
    }
  }

  private static List<String> words(Random random) {
    List<String> words = new ArrayList<>();
    for (int cell = 0; cell < 5; cell++) {
      StringBuilder word = new StringBuilder();
      for (int part = random.nextInt(6); part > 0; part--) {
        word.append(PARTS[random.nextInt(PARTS.length)]);
      }
      words.add(word.toString());
    }
    return words;
  }

  private static String written(CsvLine line) throws IOException {
    StringWriter out = new StringWriter();
    new CsvOut(out).line(line);
    return out.toString();
  }

  private static List<String> padded(List<List<String>> rows) {
    List<String> cells = new ArrayList<>(rows.size() > 1 ? rows.get(1) : List.of());
    while (cells.size() < 5) {
      cells.add("");
    }
    return cells;
  }
}
