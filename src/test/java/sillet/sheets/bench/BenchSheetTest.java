package sillet.sheets.bench;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import sillet.acoustics.readings.Reference;
import sillet.acoustics.wire.Construction;
import sillet.logbook.moves.BenchString;
import sillet.logbook.moves.Heights;
import sillet.logbook.moves.NutMovable;
import sillet.logbook.moves.SaddleRoom;
import sillet.logbook.strings.StringMake;
import sillet.sheets.csv.SheetRefused;

class BenchSheetTest {
  private static final String H = Sheets.HEADER + "\n";

  @TempDir Path folder;

  @Test
  void readsEveryColumn() throws IOException {
    String sheet =
        "instrument,string,pitch,scale_mm,gauge_in,construction,core_in,unit_mass_g_m,action12_mm,"
            + "nutgap1_mm,relief_mm,against,sd_cents,f0,f1,f12,f24,screw_mm,room_back_mm,"
            + "room_forward_mm,nut_movable,to_pitch\n"
            + "Demo bass,4,E1,863.6,.105,wound-nickel,.045,38.2,2.4,0.6,0.35,Harmonic,0.4,-0.5,"
            + "1.5,3.1/2.8 3.3,-4,0.7,6,2.5,Whole,D1\n";

    BenchString string = Sheets.read(folder, sheet).get(0);

    assertThat(string.instrument()).isEqualTo("Demo bass");
    assertThat(string.string().number()).isEqualTo(4);
    assertThat(string.string().pitch().typed()).isEqualTo("E1");
    assertThat(string.string().scaleMm()).isEqualTo(863.6);
    assertThat(string.string().make())
        .isEqualTo(new StringMake(0.105, Construction.WOUND_NICKEL, 0.045, 38.2));
    assertThat(string.heights()).isEqualTo(new Heights(2.4, 0.6, 0.35));
    assertThat(string.room())
        .isEqualTo(new SaddleRoom(0.7, 6.0, 2.5, null, null, NutMovable.WHOLE));
    assertThat(string.readings().against()).isEqualTo(Reference.HARMONIC);
    assertThat(string.readings().sdCents()).isEqualTo(0.4);
    assertThat(string.readings().open().values()).containsExactly(-0.5);
    assertThat(string.readings().frets()).containsOnlyKeys(1, 12, 24);
    assertThat(string.readings().frets().get(12).values()).containsExactly(3.1, 2.8, 3.3);
  }

  @Test
  void takesBlankForNotKnown() throws IOException {
    BenchString string = Sheets.read(folder, Sheets.with("core_in", " ")).get(0);

    assertThat(string.heights()).isEqualTo(Heights.NOT_KNOWN);
    assertThat(string.room()).isEqualTo(SaddleRoom.NOT_KNOWN);
    assertThat(string.string().make().coreIn()).isNull();
    assertThat(string.string().make().unitMassGPerM()).isNull();
    assertThat(string.readings().open()).isNull();
    assertThat(string.readings().against()).isEqualTo(Reference.OPEN);
    assertThat(string.readings().sdCents()).isEqualTo(0.5);
  }

  @Test
  void takesTheGuardOffTextAgain() throws IOException {
    assertThat(Sheets.read(folder, Sheets.with("instrument", "'=SUM(A1)")).get(0).instrument())
        .isEqualTo("=SUM(A1)");
  }

  @Test
  void reckonsOneInstrumentAtATime() throws IOException {
    List<String> order = new ArrayList<>();
    String sheet = H + row("A", 1) + row("A", 2) + row("B", 2) + row("B", 1) + row("C", 1);

    List<List<String>> groups = Sheets.groups(folder, sheet, order);

    assertThat(groups).containsExactly(List.of("A1", "A2"), List.of("B2", "B1"), List.of("C1"));
    assertThat(order).containsExactly("A1", "A2", "B2", "B1", "C1");
  }

  @Test
  void gathersAnInstrumentWhoseRowsAreScatteredAndKeepsTheOrder() throws IOException {
    List<String> order = new ArrayList<>();
    String sheet =
        H + row("A", 1) + row("B", 1) + row("A", 2) + row("C", 1) + row("C", 2) + row("B", 2);

    List<List<String>> groups = Sheets.groups(folder, sheet, order);

    assertThat(groups)
        .containsExactlyInAnyOrder(List.of("A1", "A2"), List.of("B1", "B2"), List.of("C1", "C2"));
    assertThat(order).containsExactly("A1", "B1", "A2", "C1", "C2", "B2");
  }

  @Test
  void saysSoWhenTheSheetIsChangedMeanwhile() throws IOException {
    Path path = Sheets.write(folder, H + row("A", 1));
    try (BenchSheet sheet = BenchSheet.open(path, SheetUse.MOVES)) {
      Files.writeString(path, H + "A,1,,,,,\n");

      assertThatThrownBy(() -> sheet.inOrder(one -> one, string -> {}))
          .isInstanceOfSatisfying(
              SheetRefused.class,
              refused ->
                  assertThat(refused.reasons().get(0).message().key()).isEqualTo("file.changed"));
    }
  }

  private static String row(String instrument, int string) {
    return instrument + "," + string + Sheets.ROW.substring("Demo,1".length()) + "\n";
  }
}
