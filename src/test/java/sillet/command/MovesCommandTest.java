package sillet.command;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.io.OutputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class MovesCommandTest {
  private static final String SHEET =
      """
      instrument,string,pitch,scale_mm,gauge_in,construction,screw_mm,f12
      Demo,1,E4,648,.010,plain-steel,0.5,5.0
      Demo,6,E2,648,.046,wound-steel,0.5,-3.0
      """;

  @TempDir Path folder;

  @Test
  void printsARowForEachStringAndNothingElse() throws IOException {
    Run run = Run.of("moves", sheet(SHEET));

    assertThat(run.code()).isZero();
    assertThat(run.err()).isEmpty();
    assertThat(run.out().lines())
        .hasSize(3)
        .satisfies(
            lines -> {
              assertThat(lines.get(0)).startsWith("instrument,string,saddle_move_mm,");
              assertThat(lines.get(1)).startsWith("Demo,1,").contains(",away from neck,", ",move,");
              assertThat(lines.get(2)).startsWith("Demo,6,-").contains(",toward neck,", ",move,");
            });
  }

  @Test
  void writesTheSameIntoAFileAndNothingToStandardOutput() throws IOException {
    Path sheet = sheet(SHEET);
    Path target = folder.resolve("moves.csv");

    Run run = Run.of("moves", sheet, "--out", target);

    assertThat(run).isEqualTo(new Run(0, "", ""));
    assertThat(target).hasContent(Run.of("moves", sheet).out());
  }

  @Test
  void aimsAtTheNeckWhenAsked() throws IOException {
    Path sheet = sheet(SHEET.replace("f12", "f12,f3").replace("5.0\n", "5.0,2.0\n"));

    Run octave = Run.of("moves", sheet);
    Run neck = Run.of("moves", "--aim", "neck", sheet);

    assertThat(Run.of("moves", "--aim=octave", sheet)).isEqualTo(octave);
    assertThat(neck.code()).isZero();
    assertThat(neck.out()).isNotEqualTo(octave.out());
  }

  @Test
  void warnsOnStandardErrorAndGoesOn() throws IOException {
    Run run = Run.of("moves", sheet(SHEET.replace("648", "64.8")));

    assertThat(run.code()).isZero();
    assertThat(run.out().lines()).hasSize(3);
    assertThat(run.err().lines())
        .hasSize(2)
        .allMatch(line -> line.startsWith("unusual: line "))
        .anyMatch(line -> line.contains("scale of 64.80 mm = 2.551 in"));
  }

  @Test
  void refusesWithEverythingAtOnceAndNothingOnStandardOutput() throws IOException {
    Path target = folder.resolve("moves.csv");
    Path sheet = sheet(SHEET.replace("E4", "H4").replace("-3.0", "1,234"));

    for (Run run : new Run[] {Run.of("moves", sheet), Run.of("moves", sheet, "--out", target)}) {
      assertThat(run.code()).isEqualTo(2);
      assertThat(run.out()).isEmpty();
      assertThat(run.err().lines())
          .containsExactly(
              "line 2, column 3 (pitch): “H4” is no pitch; expected a note with its octave like"
                  + " E4, F#3, Bb2, or hertz like 329.63",
              "line 3, column 9: “234” stands under no column name; is a decimal comma not"
                  + " quoted?");
    }
    assertThat(target).doesNotExist();
  }

  @Test
  void countsWhatItDoesNotList() throws IOException {
    Run run = Run.of("moves", sheet(SHEET + "Demo,0,E2,648,.046,wound-steel,,1\n".repeat(300)));

    assertThat(run.code()).isEqualTo(2);
    assertThat(run.err().lines()).hasSize(201).endsWith("and 100 more of the kind");
  }

  @Test
  void refusesAFileThatIsNotThereAFolderAndRandomBytes() throws IOException {
    byte[] random = new byte[10_000];
    new Random(2).nextBytes(random);
    Path bytes = Files.write(folder.resolve("bytes.csv"), random);

    for (Path path : new Path[] {folder.resolve("none.csv"), folder, bytes, sheet("")}) {
      Run run = Run.of("moves", path);

      assertThat(run.code()).as("%s", path).isEqualTo(2);
      assertThat(run.out()).isEmpty();
      assertThat(run.err().lines()).hasSize(1);
    }
  }

  @Test
  void neverWritesOverTheSheetItReads() throws IOException {
    Path sheet = sheet(SHEET);

    Run run =
        Run.of(
            "moves",
            sheet,
            "--out",
            folder.resolve("../" + folder.getFileName()).resolve("bench.csv"));

    assertThat(run.code()).isEqualTo(2);
    assertThat(sheet).hasContent(SHEET);
  }

  @Test
  void saysSoWhenTheMovesCannotBeWritten() throws IOException {
    Path sheet = sheet(SHEET);

    Run noFolder = Run.of("moves", sheet, "--out", folder.resolve("none/moves.csv"));
    Run intoFolder = Run.of("moves", sheet, "--out", folder);

    assertThat(noFolder.code()).isEqualTo(5);
    assertThat(noFolder.err()).startsWith("Not written: there is no folder for ").hasLineCount(1);
    assertThat(intoFolder.code()).isEqualTo(5);
    assertThat(intoFolder.err()).startsWith("Not written: ").hasLineCount(1);
  }

  @Test
  void saysSoWhenStandardOutputTakesNoMore() throws IOException {
    Run full = Run.into(failing("No space left on device"), "moves", sheet(SHEET));
    Run gone = Run.into(failing("Broken pipe"), "moves", sheet(SHEET));

    assertThat(full)
        .isEqualTo(new Run(5, "", "Standard output takes no more: No space left on device\n"));
    assertThat(gone).isEqualTo(new Run(0, "", ""));
  }

  private Path sheet(String text) throws IOException {
    return Files.writeString(folder.resolve("bench.csv"), text, StandardCharsets.UTF_8);
  }

  private static OutputStream failing(String message) {
    return new OutputStream() {
      @Override
      public void write(int one) throws IOException {
        throw new IOException(message);
      }
    };
  }
}
