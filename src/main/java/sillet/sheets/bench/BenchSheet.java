package sillet.sheets.bench;

import java.io.Closeable;
import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import java.util.function.Function;
import sillet.sheets.csv.Remarks;
import sillet.sheets.csv.SheetFile;
import sillet.sheets.csv.SheetRefused;

/**
 * A bench sheet that has been looked through and found right.
 *
 * <p>What it takes in memory does not grow with the sheet but for twenty bytes a string and little
 * more an instrument, as long as the rows of each instrument stand together. An instrument whose
 * rows are scattered is held whole.
 */
public final class BenchSheet implements Closeable {
  private final SheetFile file;
  private final Survey survey;

  /** Takes what was made of one string. */
  @FunctionalInterface
  public interface Taker<T> {
    void take(T one) throws IOException;
  }

  private BenchSheet(SheetFile file, Survey survey) {
    this.file = file;
    this.survey = survey;
  }

  /**
   * Opens a sheet and looks through it.
   *
   * @throws SheetRefused with everything that is wrong with it
   * @throws IOException if it could not be closed again
   */
  public static BenchSheet open(Path path, SheetUse use) throws IOException {
    SheetFile file = SheetFile.open(path);
    try {
      return new BenchSheet(file, Survey.of(file, use));
    } catch (SheetRefused refused) {
      file.close();
      throw refused;
    }
  }

  /** What is unusual in it, though it was taken. */
  public Remarks warnings() {
    return survey.warnings();
  }

  /**
   * Works through the sheet, one instrument at a time.
   *
   * @param reckon makes something of each string of an instrument, in the same order
   * @param taker is handed the results in the order of the rows
   * @throws IOException whatever the taker throws
   * @throws SheetRefused if the file was changed meanwhile
   */
  public <T> void inOrder(Function<List<SheetString>, List<T>> reckon, Taker<T> taker)
      throws IOException {
    new SecondLook<>(file, survey, reckon).handTo(taker);
  }

  @Override
  public void close() throws IOException {
    file.close();
  }
}
