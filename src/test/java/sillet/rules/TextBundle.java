package sillet.rules;

import java.io.IOException;
import java.io.Reader;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Properties;
import java.util.Set;
import java.util.TreeSet;

/** The keys of a file of texts, with those that stand there twice. */
record TextBundle(Set<String> keys, Set<String> twice) {

  static TextBundle read(Path file) throws IOException {
    TextBundle bundle = new TextBundle(new TreeSet<>(), new TreeSet<>());
    Properties texts =
        new Properties() {
          private static final long serialVersionUID = 1L;

          @Override
          public synchronized Object put(Object key, Object text) {
            if (!bundle.keys.add(key.toString())) {
              bundle.twice.add(key.toString());
            }
            return super.put(key, text);
          }
        };
    try (Reader reader = Files.newBufferedReader(file)) {
      texts.load(reader);
    }
    return bundle;
  }
}
