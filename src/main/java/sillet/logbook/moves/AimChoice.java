package sillet.logbook.moves;

import java.util.Collections;
import java.util.Locale;
import java.util.SortedMap;
import java.util.StringJoiner;
import java.util.TreeMap;
import sillet.acoustics.moves.Aim;
import sillet.logbook.text.Quoted;
import sillet.logbook.text.Rejection;
import sillet.logbook.units.DecimalText;
import sillet.logbook.units.Figures;

/**
 * What is to become true: fret 12 alone, frets 1 to 12 alike, or frets of the shop's own with
 * weights, where the customer plays.
 *
 * @param kind which of the three
 * @param weights weight by fret, 1 to 24, each above zero; empty unless the frets are the shop's
 *     own
 */
public record AimChoice(Kind kind, SortedMap<Integer, Double> weights) {
  /** Fret 12 agrees with its reference. */
  public static final AimChoice OCTAVE = new AimChoice(Kind.OCTAVE, new TreeMap<>());

  /** The squared errors of frets 1 to 12 are least, against the open string. */
  public static final AimChoice NECK = new AimChoice(Kind.NECK, new TreeMap<>());

  private static final int FRETS = 24;
  private static final int DECIMALS = 3;
  private static final double GREATEST_WEIGHT = 1000;

  /** Which aim it is. */
  public enum Kind {
    /** Fret 12. */
    OCTAVE("octave", "aim.octave"),
    /** Frets 1 to 12 alike. */
    NECK("neck", "aim.neck"),
    /** Frets of the shop's own. */
    FRETS("frets", "aim.frets");

    private final String word;
    private final String key;

    Kind(String word, String key) {
      this.word = word;
      this.key = key;
    }

    /**
     * The word of files and command line.
     *
     * @return stable word
     */
    public String word() {
      return word;
    }

    /**
     * The text key of its name.
     *
     * @return key of the text bundle
     */
    public String key() {
      return key;
    }
  }

  /**
   * Copies the weights and checks them.
   *
   * @throws Rejection if a fret or a weight is out of range, or frets are asked for and none named
   */
  public AimChoice {
    weights = Collections.unmodifiableSortedMap(new TreeMap<>(weights));
    if ((kind == Kind.FRETS) == weights.isEmpty()) {
      throw Rejection.of("aim.no-fret");
    }
    weights.forEach(
        (fret, weight) -> {
          if (fret < 1 || fret > FRETS) {
            throw Rejection.of("aim.fret", Integer.toString(fret));
          }
          if (!(weight >= Math.pow(10, -DECIMALS)) || weight > GREATEST_WEIGHT) {
            throw Rejection.of("aim.weight", Integer.toString(fret));
          }
        });
  }

  /**
   * Reads what was typed or stored.
   *
   * @param text {@code octave}, {@code neck}, or frets with weights as in {@code 1 5 7 12:2}; a
   *     fret without a weight weighs 1
   * @return the aim
   * @throws Rejection if it is none of these
   */
  public static AimChoice parse(String text) {
    String asked = text.strip().toLowerCase(Locale.ROOT);
    if (asked.equals(Kind.OCTAVE.word())) {
      return OCTAVE;
    }
    if (asked.equals(Kind.NECK.word())) {
      return NECK;
    }
    SortedMap<Integer, Double> weights = new TreeMap<>();
    if (!asked.isEmpty()) {
      for (String part : asked.split("[\\s;]+", -1)) {
        put(weights, part);
      }
    }
    return new AimChoice(Kind.FRETS, weights);
  }

  private static void put(SortedMap<Integer, Double> weights, String part) {
    int colon = part.indexOf(':');
    String fret = colon < 0 ? part : part.substring(0, colon);
    if (!fret.matches("[0-9]{1,3}")) {
      throw Rejection.of("aim.unknown", Quoted.of(part));
    }
    double weight = colon < 0 ? 1 : DecimalText.parse(part.substring(colon + 1)).value();
    if (weights.put(Integer.valueOf(fret), weight) != null) {
      throw Rejection.of("aim.fret-twice", fret);
    }
  }

  /**
   * The same for the physics.
   *
   * @return what a move is to make true
   */
  public Aim acoustic() {
    return switch (kind) {
      case OCTAVE -> Aim.OCTAVE;
      case NECK -> Aim.NECK;
      case FRETS -> Aim.frets(weights);
    };
  }

  /**
   * The form it is stored in; {@link #parse} reads it back.
   *
   * @return {@code octave}, {@code neck}, or frets as in {@code 1 5 7 12:2}
   */
  public String word() {
    if (kind != Kind.FRETS) {
      return kind.word();
    }
    StringJoiner words = new StringJoiner(" ");
    weights.forEach((fret, weight) -> words.add(weight == 1 ? "" + fret : fret + ":" + of(weight)));
    return words.toString();
  }

  private static String of(double weight) {
    String fixed = Figures.fixed(weight, DECIMALS);
    return fixed.replaceAll("\\.?0+$", "");
  }
}
