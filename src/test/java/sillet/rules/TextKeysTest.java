package sillet.rules;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Path;
import java.util.Collection;
import java.util.Set;
import java.util.TreeSet;
import java.util.regex.Pattern;
import java.util.stream.Collectors;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestInstance;

/**
 * The words the program says and the words it has, compared in both directions.
 *
 * <p>A key is a literal handed to {@code say} or to a message, or any dotted literal in lower case
 * whose first part is the first part of a key in the bundle ({@code move.away}); names of files are
 * not meant. Keys are always written out whole, so that a search finds them.
 */
@TestInstance(TestInstance.Lifecycle.PER_CLASS)
class TextKeysTest {
  private static final Path SOURCES = Path.of("src/main/java");
  private static final Path BUNDLE = Path.of("src/main/resources/sillet/texts.properties");
  private static final Pattern KEY = Pattern.compile("[a-z][a-z0-9-]*(\\.[a-z0-9][a-z0-9-]*)+");
  private static final Pattern FILE =
      Pattern.compile(".*\\.(csv|css|db|fxml|json|log|pdf|png|properties|sql|tmp|ttf|txt|zip)");

  private final SourceStrings strings;
  private final TextBundle bundle;

  TextKeysTest() throws IOException {
    strings = SourceStrings.of(SOURCES);
    bundle = TextBundle.read(BUNDLE);
  }

  @Test
  void everyKeyUsedHasAText() {
    Set<String> keys = bundle.keys();
    Set<String> missing = keysUsed(keys);
    missing.removeAll(keys);

    assertThat(missing).as("add to %s:\n%s\n", BUNDLE, lines(missing)).isEmpty();
  }

  @Test
  void everyTextIsUsed() {
    Set<String> unused = new TreeSet<>(bundle.keys());
    unused.removeAll(strings.all());

    assertThat(unused).as("take out of %s:\n%s\n", BUNDLE, lines(unused)).isEmpty();
  }

  @Test
  void everyKeyIsWrittenOutWhole() {
    assertThat(strings.gluedKeys()).isEmpty();
  }

  @Test
  void noKeyStandsTwice() {
    assertThat(bundle.twice()).isEmpty();
  }

  @Test
  void everyKeyIsDottedAndLowerCase() {
    assertThat(bundle.keys()).allSatisfy(key -> assertThat(key).matches(KEY).doesNotMatch(FILE));
  }

  private Set<String> keysUsed(Set<String> keys) {
    Set<String> openings = keys.stream().map(TextKeysTest::opening).collect(Collectors.toSet());
    Set<String> used = new TreeSet<>(strings.said());
    strings.all().stream()
        .filter(text -> KEY.matcher(text).matches() && !FILE.matcher(text).matches())
        .filter(text -> openings.contains(opening(text)))
        .forEach(used::add);
    return used;
  }

  private static String opening(String key) {
    return key.substring(0, key.indexOf('.') < 0 ? key.length() : key.indexOf('.'));
  }

  private static String lines(Collection<String> keys) {
    return keys.stream().map(key -> key + " = ").collect(Collectors.joining("\n"));
  }
}
