package sillet.command;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Whatever a sheet holds, the answer is moves or a refusal, never an accident. */
class HostileSheetsTest {
  private static final String SHEET =
      "instrument,string,pitch,scale_mm,gauge_in,construction,core_in,unit_mass_g_m,action12_mm,"
          + "nutgap1_mm,relief_mm,against,sd_cents,f0,f3,f12,screw_mm,room_back_mm,nut_movable\n"
          + "Demo,1,E4,648,.010,plain-steel,,0.4,1.6,0.5,0.2,open,0.5,0,1,5.0/5.1,0.5,6,no\n"
          + "Demo,6,E2,648,.046,wound-steel,.018,,2,0.5,0.2,harmonic,0.3,,,-3.0,0.5,0.1,each\n";
  private static final String[] FIGURES = {
    "0",
    "-0",
    "0.000000001",
    "-1",
    "1",
    "99999999999999999999999999999999999999",
    "100",
    "-100",
    ".0001",
    "1e9",
    "NaN",
    "\"",
    ",",
    "\n",
    "",
    "C-1",
    "B9",
    "whole",
    "'=1",
    "\0"
  };

  @TempDir Path folder;

  @Test
  void changedBytesNeverCauseAnAccident() throws IOException {
    Random random = new Random(99);
    for (int run = 0; run < 400; run++) {
      byte[] bytes = SHEET.getBytes(StandardCharsets.UTF_8);
      for (int change = random.nextInt(4); change >= 0; change--) {
        bytes[random.nextInt(bytes.length)] = (byte) random.nextInt(128);
      }
      expectMovesOrRefusal(bytes, "run " + run);
    }
  }

  @Test
  void extremeFiguresNeverCauseAnAccident() throws IOException {
    Random random = new Random(100);
    String[] cells = SHEET.split("(?<=[,\n])", -1);
    for (int run = 0; run < 600; run++) {
      String[] changed = cells.clone();
      for (int change = random.nextInt(3); change >= 0; change--) {
        int cell = 19 + random.nextInt(38);
        String end = changed[cell].endsWith("\n") ? "\n" : ",";
        changed[cell] = FIGURES[random.nextInt(FIGURES.length)] + end;
      }
      String sheet = String.join("", changed);
      expectMovesOrRefusal(sheet.getBytes(StandardCharsets.UTF_8), sheet);
    }
  }

  private void expectMovesOrRefusal(byte[] bytes, String what) throws IOException {
    Run run = Run.of("moves", Files.write(folder.resolve("bench.csv"), bytes));

    assertThat(run.code()).as("%s%n%s", what, run.err()).isIn(0, 2);
    assertThat(run.out().isEmpty()).as("%s", what).isEqualTo(run.code() == 2);
    assertThat(run.err()).doesNotContain("Exception");
  }
}
