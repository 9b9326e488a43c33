package sillet.acoustics.findings;

import java.util.ArrayList;
import java.util.List;
import sillet.acoustics.findings.LinearNeck.Amount;

/** One reading that lies far off what all the others say of that note. */
final class ReadingTrial implements CauseTrial {
  /** Cents from which a reading is called wild. */
  static final double WILD = 3;

  private static final double SIGNIFICANT = 4.8;

  /** Where the top resounds single notes stray far by themselves. */
  private static final double RESOUNDING = 1.2;

  @Override
  public List<Suspect> look(NeckCase notes, LinearNeck neck) {
    List<Suspect> suspects = new ArrayList<>();
    double significant = SIGNIFICANT * (notes.resounds() ? RESOUNDING : 1);
    for (int row = 0; row < neck.rows(); row++) {
      NeckCase.Row note = notes.rows().get(row);
      if (note.fret() == NeckCase.HEIGHT) {
        continue;
      }
      Amount off = neck.alone(row);
      if (Math.abs(off.value()) >= WILD && off.significance() >= significant) {
        double[] shape = new double[neck.rows()];
        shape[row] = 1;
        suspects.add(
            new Suspect(
                Kind.READING,
                note.string(),
                note.fret(),
                false,
                off.value(),
                off.sd(),
                off.gain(),
                significant * significant,
                Suspect.Shapes.of(shape)));
      }
    }
    return suspects;
  }
}
