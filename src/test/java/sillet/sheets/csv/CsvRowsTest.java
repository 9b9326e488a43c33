package sillet.sheets.csv;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class CsvRowsTest {
  @TempDir Path folder;

  @Test
  void readsCellsAndLeavesOutBlankRowsAndTrailingBlankCells() throws IOException {
    Reading reading = Reading.of(folder, "\n , ,\na, b ,,\n\n,c\n;\n");

    assertThat(reading.rows).containsExactly(List.of("a", "b"), List.of("", "c"), List.of(";"));
    assertThat(reading.said).isEmpty();
  }

  @Test
  void countsLinesAsAnEditorDoes() throws IOException {
    Reading reading = Reading.of(folder, "a,b\r\n\r\nc,\"d\ne\",f,\"g\"\r\nh,i\rj,k");

    assertThat(reading.raw).extracting(CsvRow::line).containsExactly(1L, 3L, 5L, 6L);
    CsvRow torn = reading.raw.get(1);
    assertThat(torn.place(1, "x")).isEqualTo(Place.cell(3, 2, "x"));
    assertThat(torn.place(2, "y")).isEqualTo(Place.cell(4, 3, "y"));
    assertThat(torn.place(3, "z")).isEqualTo(Place.cell(4, 4, "z"));
  }

  @Test
  void takesQuotedCellsApart() throws IOException {
    Reading reading = Reading.of(folder, "\"a,1\",\"say \"\"so\"\"\",\"\",\\,\"\\\",\"x\r\ny\"\n");

    assertThat(reading.rows).containsExactly(List.of("a,1", "say \"so\"", "", "\\", "\\", "x\ny"));
  }

  @Test
  void findsTheSemicolonByTheHeader() throws IOException {
    Reading reading = Reading.of(folder, "\"a;b\";c\n1,5;2,5\n1,5,5,5;2,5\n");

    assertThat(reading.rows)
        .containsExactly(List.of("a;b", "c"), List.of("1,5", "2,5"), List.of("1,5,5,5", "2,5"));
  }

  @Test
  void findsTheSeparatorByAllLinesWhereTheHeaderHasNone() throws IOException {
    assertThat(Reading.of(folder, "a\n1;2,5\n3;4\n5;6\n").rows.get(1)).containsExactly("1", "2,5");
    assertThat(Reading.of(folder, "a\n1,2;5\n3,4\n5,6\n").rows.get(1)).containsExactly("1", "2;5");
  }

  @Test
  void namesTheByteThatIsNoUtf8() throws IOException {
    Reading reading = Reading.of(folder, "a,b\nM\u00fcller,1\n", StandardCharsets.ISO_8859_1);

    assertThat(reading.rows).containsExactly(List.of("a", "b"));
    assertThat(reading.said).hasSize(1);
    assertThat(reading.said.get(0).place()).isEqualTo(Place.character(2, 2));
    assertThat(reading.said.get(0).message().key()).isEqualTo("sheet.not-utf8");
    assertThat(reading.said.get(0).message().values()).containsExactly("FC");
  }

  @Test
  void refusesANulCharacter() throws IOException {
    Reading reading = Reading.of(folder, "a,b\n1,2\0\n");

    assertThat(reading.keys()).containsExactly("sheet.no-text");
    assertThat(reading.said.get(0).place()).isEqualTo(Place.character(2, 4));
  }

  @Test
  void passesOverALineOfAHundredThousandCharacters() throws IOException {
    Reading reading = Reading.of(folder, "a,b\n" + "x".repeat(100_000) + "\n1,2\n");

    assertThat(reading.rows).containsExactly(List.of("a", "b"), List.of("1", "2"));
    assertThat(reading.keys()).containsExactly("sheet.line-too-long");
    assertThat(reading.said.get(0).place()).isEqualTo(Place.line(2));
  }

  @Test
  void keepsALineOfExactlyTheLongestLength() throws IOException {
    String longest = "x".repeat(Lines.LONGEST);

    assertThat(Reading.of(folder, longest + "\n" + longest + "y\n").rows)
        .containsExactly(List.of(longest));
  }

  @Test
  void namesTheQuoteThatIsNeverClosed() throws IOException {
    Reading atTheEnd = Reading.of(folder, "a,b\n1,\"2\n3,4\n");
    Reading inALongSheet = Reading.of(folder, "a,b\n\"1\",\"2\n" + "3,4\n".repeat(20_000));

    assertThat(atTheEnd.keys()).containsExactly("sheet.quote-open");
    assertThat(atTheEnd.said.get(0).place()).isEqualTo(Place.character(2, 3));
    assertThat(inALongSheet.keys()).containsExactly("sheet.quote-open");
    assertThat(inALongSheet.said.get(0).place()).isEqualTo(Place.character(2, 5));
  }

  @Test
  void namesTheLineOfAQuoteOpenedAfterATornCell() throws IOException {
    Reading reading = Reading.of(folder, "a,b\n\"1\n1\",\"2\n3,4\n");

    assertThat(reading.said.get(0).place()).isEqualTo(Place.character(3, 4));
  }

  @Test
  void refusesAQuotationMarkInsideABareCell() throws IOException {
    Reading reading = Reading.of(folder, "a,b\n1,12\"\n\"3\"x,4\n5,6\n");

    assertThat(reading.rows).containsExactly(List.of("a", "b"), List.of("5", "6"));
    assertThat(reading.keys()).containsExactly("sheet.stray-quote", "sheet.stray-quote");
    assertThat(reading.said)
        .extracting(Remark::place)
        .containsExactly(Place.character(2, 5), Place.character(3, 4));
  }
}
