package sillet.sheets.csv;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.io.StringWriter;
import java.io.Writer;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class CsvOutTest {
  @Test
  void writesCommaDotAndLineFeedAndQuotesOnlyWhereNeeded() throws IOException {
    StringWriter out = new StringWriter();
    CsvOut csv = new CsvOut(out);
    csv.header(List.of("name", "mm", "n"));
    csv.line(new CsvLine().text("plain").figure(-1.86, 3).count(2));
    csv.line(new CsvLine().text("a, \"b\"").figure(null, 3).count(null));
    csv.line(new CsvLine().text("two\r\nlines").figure(-0.0001, 3).blank());

    assertThat(out)
        .hasToString("name,mm,n\nplain,-1.860,2\n\"a, \"\"b\"\"\",,\ntwo  lines,0.000,\n");
  }

  @ParameterizedTest
  @CsvSource(
      quoteCharacter = '`',
      value = {
        "=cmd, '=cmd",
        "+1, '+1",
        "-1, '-1",
        "@x, '@x",
        "'=x, ''=x",
        "'quoted', 'quoted'",
        "a=b, a=b"
      })
  void guardsTextThatASpreadsheetWouldReckonWith(String text, String cell) {
    assertThat(Guard.on(text)).isEqualTo(cell);
    assertThat(Guard.off(cell)).isEqualTo(text);
  }

  @Test
  void guardsTextAfterSpaceAndControlCharactersAreGone() throws IOException {
    StringWriter out = new StringWriter();
    new CsvOut(out).line(new CsvLine().text(" \t=1+1").figure(-3.5, 1));

    assertThat(out).hasToString("'=1+1,-3.5\n");
  }

  @Test
  void passesOnAFailedWrite() {
    Writer full =
        new Writer() {
          @Override
          public void write(char[] text, int from, int length) throws IOException {
            throw new IOException("no space left");
          }

          @Override
          public void flush() {}

          @Override
          public void close() {}
        };

    assertThatThrownBy(() -> new CsvOut(full).header(List.of("a")))
        .isInstanceOf(IOException.class)
        .hasMessage("no space left");
  }
}
