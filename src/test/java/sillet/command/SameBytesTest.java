package sillet.command;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.charset.Charset;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Locale;
import java.util.Random;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** However a sheet is written, the same readings give the same bytes. */
class SameBytesTest {
  private static final List<List<String>> SHEET =
      List.of(
          List.of(
              "instrument",
              "string",
              "pitch",
              "scale_mm",
              "gauge_in",
              "construction",
              "action12_mm",
              "sd_cents",
              "f0",
              "f5",
              "f12",
              "screw_mm",
              "room_back_mm"),
          List.of(
              "D\u00e9mo; one",
              "1",
              "E4",
              "647.7",
              "0.010",
              "plain-steel",
              "1.6",
              "0.3",
              "0.2",
              "1.1",
              "5.0/5.2/4.9",
              "0.5",
              "6.5"),
          List.of(
              "D\u00e9mo; one",
              "6",
              "82.41",
              "647.7",
              "0.046",
              "wound-steel",
              "2.1",
              "",
              "",
              "",
              "-2.6",
              "0.5",
              ""),
          List.of(
              "=two, \"too\"",
              "4",
              "E1",
              "863.6",
              "0.105",
              "wound-nickel",
              "2.4",
              "0.5",
              "",
              "0.4 0.6",
              "3",
              "0.7",
              "0.5"));

  @TempDir Path folder;
  private String expected;

  @BeforeEach
  void plain() throws IOException {
    Run run = run(new Shape(), StandardCharsets.UTF_8);
    assertThat(run.code()).isZero();
    assertThat(run.out().lines()).hasSize(4);
    expected = run.out();
  }

  @Test
  void aByteOrderMarkChangesNothing() throws IOException {
    Shape shape = new Shape();
    shape.mark = "\ufeff";

    assertThat(run(shape, StandardCharsets.UTF_8).out()).isEqualTo(expected);
    assertThat(run(shape, StandardCharsets.UTF_16LE).out()).isEqualTo(expected);
    assertThat(run(shape, StandardCharsets.UTF_16BE).out()).isEqualTo(expected);
  }

  @Test
  void lineEndsChangeNothing() throws IOException {
    Shape shape = new Shape();
    shape.lineEnd = "\r\n";

    assertThat(run(shape, StandardCharsets.UTF_8).out()).isEqualTo(expected);
  }

  @Test
  void semicolonsAndDecimalCommasChangeNothing() throws IOException {
    Shape shape = new Shape();
    shape.separator = ';';
    shape.decimalSign = ',';

    assertThat(run(shape, StandardCharsets.UTF_8).out()).isEqualTo(expected);
  }

  @Test
  void quotedCellsChangeNothing() throws IOException {
    Shape shape = new Shape();
    shape.quoteAll = true;
    shape.decimalSign = ',';

    assertThat(run(shape, StandardCharsets.UTF_8).out()).isEqualTo(expected);
  }

  @Test
  void columnOrderChangesNothing() throws IOException {
    Shape shape = new Shape();
    shape.order = new Random(3);

    assertThat(run(shape, StandardCharsets.UTF_8).out()).isEqualTo(expected);
  }

  @Test
  void noMixtureOfTheseChangesAnything() throws IOException {
    Random random = new Random(12);
    Charset[] charsets = {
      StandardCharsets.UTF_8, StandardCharsets.UTF_16LE, StandardCharsets.UTF_16BE
    };
    for (int run = 0; run < 100; run++) {
      Charset charset = charsets[random.nextInt(3)];
      Shape shape = Shape.any(random);
      shape.mark = charset.equals(StandardCharsets.UTF_8) && random.nextBoolean() ? "" : "\ufeff";

      assertThat(run(shape, charset).out()).as("run %d", run).isEqualTo(expected);
    }
  }

  private Run run(Shape shape, Charset charset) throws IOException {
    byte[] bytes = shape.write().getBytes(charset);
    return Run.of("moves", Files.write(folder.resolve("bench.csv"), bytes));
  }

  /** One of the ways to write the same sheet. */
  private static final class Shape {
    private String mark = "";
    private String lineEnd = "\n";
    private char separator = ',';
    private char decimalSign = '.';
    private boolean quoteAll;
    private boolean upperCase;
    private Random order;
    private Random blanks;

    static Shape any(Random random) {
      Shape shape = new Shape();
      shape.lineEnd = random.nextBoolean() ? "\r\n" : "\n";
      shape.separator = random.nextBoolean() ? ';' : ',';
      shape.quoteAll = random.nextBoolean();
      shape.decimalSign = random.nextBoolean() ? ',' : '.';
      shape.upperCase = random.nextBoolean();
      shape.order = random;
      shape.blanks = random;
      return shape;
    }

    String write() {
      List<Integer> columns = new ArrayList<>();
      for (int i = 0; i < SHEET.get(0).size(); i++) {
        columns.add(i);
      }
      if (order != null) {
        Collections.shuffle(columns, order);
      }
      StringBuilder text = new StringBuilder(mark);
      for (int row = 0; row < SHEET.size(); row++) {
        List<String> cells = new ArrayList<>();
        for (int column : columns) {
          cells.add(cell(row, column));
        }
        text.append(blankRow()).append(String.join("" + separator, cells));
        text.append(blankCells()).append(lineEnd);
      }
      return text.toString();
    }

    private String cell(int row, int column) {
      String cell = SHEET.get(row).get(column);
      if (row == 0) {
        cell = upperCase ? " " + cell.toUpperCase(Locale.ROOT) + " " : cell;
      } else if (column > 0) {
        cell = cell.replace('.', decimalSign);
      }
      boolean quote = quoteAll || cell.indexOf(separator) >= 0 || cell.indexOf('"') >= 0;
      return quote ? '"' + cell.replace("\"", "\"\"") + '"' : cell;
    }

    private String blankRow() {
      return blanks != null && blanks.nextInt(3) == 0 ? " " + separator + lineEnd : "";
    }

    private String blankCells() {
      return blanks == null ? "" : String.valueOf(separator).repeat(blanks.nextInt(3));
    }
  }
}
