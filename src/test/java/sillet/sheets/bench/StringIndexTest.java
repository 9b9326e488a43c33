package sillet.sheets.bench;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.HashMap;
import java.util.Map;
import java.util.Random;
import org.junit.jupiter.api.Test;

class StringIndexTest {
  @Test
  void remembersWhatAMapRemembers() {
    Random random = new Random(64);
    Map<Long, Long> map = new HashMap<>();
    StringIndex index = new StringIndex();
    for (long line = 1; line <= 50_000; line++) {
      long key = random.nextInt(20_000);
      map.put(key, line);
      index.put(key, line, (int) (line % 7));
    }

    for (long key = -10; key < 20_010; key++) {
      long line = map.getOrDefault(key, 0L);
      assertThat(index.line(key)).isEqualTo(line);
      assertThat(line == 0 || index.rank(key) == line % 7).isTrue();
    }
  }

  @Test
  void givesNeighboursDifferentFingerprints() {
    long one = Fingerprint.of("Demo");

    assertThat(Fingerprint.of("Demo", "")).isNotEqualTo(one);
    assertThat(Fingerprint.of("a", "bc")).isNotEqualTo(Fingerprint.of("ab", "c"));
    assertThat(Fingerprint.of(one, 1)).isNotEqualTo(Fingerprint.of(one, 2));
  }
}
