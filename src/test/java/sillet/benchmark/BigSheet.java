package sillet.benchmark;

import java.io.BufferedWriter;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.Random;

/**
 * A bench sheet of any size: six-string instruments one after the other, every reading another,
 * some with several tries, as a shop of giants would keep it. The same size gives the same bytes.
 */
final class BigSheet {
  private static final String HEADER =
      "instrument,string,pitch,scale_mm,gauge_in,construction,action12_mm,nutgap1_mm,relief_mm,"
          + "against,sd_cents,f12,screw_mm,room_back_mm,room_forward_mm\n";
  private static final List<String> STRINGS =
      List.of(
          "1,E4,648,0.010,plain-steel", "2,B3,648,0.013,plain-steel",
          "3,G3,648,0.017,plain-steel", "4,D3,648,0.026,wound-steel",
          "5,A2,648,0.036,wound-steel", "6,E2,648,0.046,wound-steel");

  private BigSheet() {}

  /**
   * Writes a sheet.
   *
   * @return how many strings it holds
   */
  static long write(Path path, long bytes) throws IOException {
    Random random = new Random(200);
    long written = HEADER.length();
    long strings = 0;
    try (BufferedWriter out = Files.newBufferedWriter(path, StandardCharsets.UTF_8)) {
      out.write(HEADER);
      for (int instrument = 1; written < bytes; instrument++) {
        for (String string : STRINGS) {
          String row = row(instrument, string, random);
          out.write(row);
          written += row.length();
          strings++;
        }
      }
    }
    return strings;
  }

  private static String row(int instrument, String string, Random random) {
    double cents = 3 * random.nextGaussian();
    String tries =
        random.nextInt(4) == 0
            ? String.format(Locale.ROOT, "%.1f/%.1f/%.1f", cents, cents + 0.2, cents - 0.1)
            : String.format(Locale.ROOT, "%.1f", cents);
    return String.format(
        Locale.ROOT,
        "Demo instrument %d,%s,1.7,0.45,0.2,open,0.3,%s,0.5,%.1f,2.5\n",
        instrument,
        string,
        tries,
        2 + 4 * random.nextDouble());
  }
}
