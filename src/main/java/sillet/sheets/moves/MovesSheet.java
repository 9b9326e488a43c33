package sillet.sheets.moves;

import java.io.IOException;
import java.io.Writer;
import java.util.List;
import org.jspecify.annotations.Nullable;
import sillet.logbook.moves.MoveAdvice;
import sillet.logbook.moves.MoveFigures;
import sillet.logbook.text.Texts;
import sillet.sheets.csv.CsvLine;
import sillet.sheets.csv.CsvOut;

/** Writes the moves, row after row. */
public final class MovesSheet {
  private static final List<String> COLUMNS =
      List.of(
          "instrument",
          "string",
          "saddle_move_mm",
          "saddle_low_mm",
          "saddle_high_mm",
          "turns",
          "direction",
          "nut_move_mm",
          "cents12_before",
          "cents12_after",
          "rms_before",
          "rms_after",
          "verdict",
          "findings",
          "note");

  private final CsvOut out;
  private final Texts texts;

  /**
   * Begins a sheet with its header.
   *
   * @throws IOException if it cannot be written
   */
  public MovesSheet(Writer out, Texts texts) throws IOException {
    this.out = new CsvOut(out);
    this.texts = texts;
    this.out.header(COLUMNS);
  }

  /** Writes the row of one string. */
  public void write(MoveAdvice advice) throws IOException {
    CsvLine line =
        new CsvLine().text(advice.string().instrument()).count(advice.string().string().number());
    figures(line, advice.figures());
    out.line(
        line.word(advice.verdict().word())
            .word(AdviceCells.findings(advice))
            .text(AdviceCells.note(advice, texts)));
  }

  private static void figures(CsvLine line, @Nullable MoveFigures figures) {
    if (figures == null) {
      for (int i = COLUMNS.indexOf("saddle_move_mm"); i < COLUMNS.indexOf("verdict"); i++) {
        line.blank();
      }
      return;
    }
    line.figure(figures.saddleMm(), AdviceCells.MM_DECIMALS)
        .figure(figures.lowMm(), AdviceCells.MM_DECIMALS)
        .figure(figures.highMm(), AdviceCells.MM_DECIMALS)
        .figure(figures.turns(), AdviceCells.CENTS_DECIMALS)
        .word(AdviceCells.direction(figures.saddleMm()))
        .figure(figures.nutMm(), AdviceCells.MM_DECIMALS)
        .figure(figures.cents12Before(), AdviceCells.CENTS_DECIMALS)
        .figure(figures.cents12After(), AdviceCells.CENTS_DECIMALS)
        .figure(figures.rmsBefore(), AdviceCells.CENTS_DECIMALS)
        .figure(figures.rmsAfter(), AdviceCells.CENTS_DECIMALS);
  }
}
