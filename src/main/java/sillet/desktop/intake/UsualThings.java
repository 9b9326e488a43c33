package sillet.desktop.intake;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Function;
import sillet.acoustics.wire.Construction;
import sillet.logbook.instruments.InstrumentKind;
import sillet.logbook.instruments.SaddleKind;
import sillet.logbook.strings.ConstructionWords;
import sillet.logbook.strings.Tuning;
import sillet.logbook.units.DecimalText;

/** The usual figures and tunings of each kind, from the file that is shipped with the program. */
public final class UsualThings {
  private static final String FILE = "/sillet/desktop/usual.txt";

  private final Map<InstrumentKind, UsualKind> kinds = new EnumMap<>(InstrumentKind.class);
  private final Map<InstrumentKind, List<Tuning>> tunings = new EnumMap<>(InstrumentKind.class);

  private UsualThings() {}

  /** Reads the file. */
  public static UsualThings load() {
    InputStream file = UsualThings.class.getResourceAsStream(FILE);
    if (file == null) {
      throw new IllegalStateException(FILE + " is missing from the program");
    }
    UsualThings usual = new UsualThings();
    try (BufferedReader lines =
        new BufferedReader(new InputStreamReader(file, StandardCharsets.UTF_8))) {
      for (String line = lines.readLine(); line != null; line = lines.readLine()) {
        usual.take(line);
      }
    } catch (IOException e) {
      throw new UncheckedIOException(FILE + " cannot be read", e);
    }
    return usual;
  }

  private void take(String line) {
    if (line.isBlank() || line.startsWith("#")) {
      return;
    }
    List<String> words = Arrays.asList(line.strip().split("\\s+", -1));
    InstrumentKind kind = byWord(InstrumentKind.values(), InstrumentKind::word, words.get(1));
    if (words.get(0).equals("kind")) {
      kinds.put(kind, usualKind(kind, words));
    } else {
      String name = words.get(2).replace('-', ' ');
      tunings
          .computeIfAbsent(kind, first -> new ArrayList<>())
          .add(Tuning.of(name, words.subList(3, words.size())));
    }
  }

  private static UsualKind usualKind(InstrumentKind kind, List<String> words) {
    return new UsualKind(
        kind,
        Integer.parseInt(words.get(2)),
        Integer.parseInt(words.get(3)),
        byWord(SaddleKind.values(), SaddleKind::word, words.get(4)),
        byWord(Construction.values(), ConstructionWords::of, words.get(5)),
        byWord(Construction.values(), ConstructionWords::of, words.get(6)),
        DecimalText.parse(words.get(7)).value());
  }

  private static <E> E byWord(E[] all, Function<E, String> word, String asked) {
    Optional<E> found = Arrays.stream(all).filter(one -> word.apply(one).equals(asked)).findFirst();
    return found.orElseThrow(() -> new IllegalStateException(FILE + ": " + asked));
  }

  /** What an instrument of a kind usually is. */
  public UsualKind of(InstrumentKind kind) {
    UsualKind usual = kinds.get(kind);
    if (usual == null) {
      throw new IllegalStateException(FILE + " has no line for " + kind.word());
    }
    return usual;
  }

  /** Tunings of a kind with so many strings. */
  public List<Tuning> tunings(InstrumentKind kind, int strings) {
    return tunings.getOrDefault(kind, List.of()).stream()
        .filter(tuning -> tuning.pitches().size() == strings)
        .toList();
  }
}
