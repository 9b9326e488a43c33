package sillet.sheets.moves;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.io.StringWriter;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import sillet.acoustics.wire.Construction;
import sillet.logbook.moves.BenchString;
import sillet.logbook.moves.Finding;
import sillet.logbook.moves.FindingReport;
import sillet.logbook.moves.Heights;
import sillet.logbook.moves.MoveAdvice;
import sillet.logbook.moves.MoveFigures;
import sillet.logbook.moves.NoteReadings;
import sillet.logbook.moves.SaddleRoom;
import sillet.logbook.moves.Verdict;
import sillet.logbook.strings.FittedString;
import sillet.logbook.strings.StringMake;
import sillet.logbook.text.Message;
import sillet.logbook.text.Texts;
import sillet.logbook.units.Pitch;
import sillet.logbook.units.Tries;

class MovesSheetTest {
  private static final FindingReport READ_AGAIN =
      new FindingReport(
          Finding.READING,
          1,
          12,
          false,
          0,
          Message.of("move.leave"),
          Message.of("finding.reading.do"),
          null);
  private static final String HEADER =
      "instrument,string,saddle_move_mm,saddle_low_mm,saddle_high_mm,turns,direction,nut_move_mm,"
          + "cents12_before,cents12_after,rms_before,rms_after,verdict,findings,note\n";

  @Test
  void writesARowAsTheContractSays() throws IOException {
    assertThat(
            written(advice("Demo", figures(1.86, 3.72, null), Verdict.MOVE, List.of(READ_AGAIN))))
        .isEqualTo(
            HEADER
                + "Demo,1,1.860,1.660,2.060,3.72,away from neck,,5.00,0.01,2.50,0.50,move,reading,"
                + "\"Leave it: less than the reading can tell. Read that note again, three tries, before"
                + " anything is moved.\"\n");
  }

  @Test
  void saysTheWayInWordsAndNeverAMinusZero() throws IOException {
    assertThat(written(advice("Demo", figures(-0.42, null, -0.0), Verdict.LEAVE, List.of())))
        .contains("Demo,1,-0.420,-0.620,-0.220,,toward neck,0.000,");
    assertThat(written(advice("Demo", figures(-0.0004, 0.0, null), Verdict.LEAVE, List.of())))
        .contains("Demo,1,0.000,-0.200,0.200,0.00,stay,,");
  }

  @Test
  void leavesBlankWhatCouldNotBeSolved() throws IOException {
    assertThat(written(advice("Demo", null, Verdict.LEAVE, List.of())))
        .isEqualTo(HEADER + "Demo,1,,,,,,,,,,,leave,,Leave it: less than the reading can tell.\n");
  }

  @Test
  void keepsHostileNamesOnOneLineAndHarmless() throws IOException {
    assertThat(written(advice("=cmd|' /C calc'!A0", null, Verdict.LEAVE, List.of())))
        .contains("\n'=cmd|' /C calc'!A0,1,");
    assertThat(written(advice("two\nlines, \"so\"", null, Verdict.LEAVE, List.of())))
        .contains("\n\"two lines, \"\"so\"\"\",1,");
  }

  private static String written(MoveAdvice advice) throws IOException {
    StringWriter out = new StringWriter();
    new MovesSheet(out, Texts.english()).write(advice);
    return out.toString();
  }

  private static MoveFigures figures(double saddleMm, Double turns, Double nutMm) {
    return new MoveFigures(
        saddleMm,
        saddleMm - 0.2,
        saddleMm + 0.2,
        turns,
        nutMm,
        5.0,
        0.5,
        0.01,
        2.5,
        0.5,
        -2.68,
        1.0);
  }

  private static MoveAdvice advice(
      String instrument, MoveFigures figures, Verdict verdict, List<FindingReport> findings) {
    FittedString fitted =
        new FittedString(
            1,
            Pitch.parse("E4", Pitch.CONCERT_A4_HZ),
            648,
            StringMake.of(0.010, Construction.PLAIN_STEEL));
    BenchString string =
        new BenchString(
            instrument,
            fitted,
            Heights.NOT_KNOWN,
            SaddleRoom.NOT_KNOWN,
            NoteReadings.of(Map.of(12, Tries.parse("5.0"))));
    return new MoveAdvice(
        string, figures, verdict, List.of(), findings, List.of(Message.of("move.leave")));
  }
}
