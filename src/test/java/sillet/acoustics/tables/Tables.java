package sillet.acoustics.tables;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** Reads the tables of reference values; lines that begin with "# " name their source and mark. */
public final class Tables {

  private static final String COMMENT = "# ";

  private Tables() {}

  public static List<Row> read(String file) {
    List<String> lines = new ArrayList<>();
    try (InputStream in = Tables.class.getResourceAsStream("/sillet/acoustics/" + file);
        BufferedReader reader =
            new BufferedReader(new InputStreamReader(in, StandardCharsets.UTF_8))) {
      reader.lines().filter(line -> !line.startsWith(COMMENT)).forEach(lines::add);
    } catch (IOException unreadable) {
      throw new UncheckedIOException(unreadable);
    }
    String[] header = lines.get(0).split(",", -1);
    return lines.stream().skip(1).map(line -> row(file, header, line)).toList();
  }

  private static Row row(String file, String[] header, String line) {
    String[] cells = line.split(",", -1);
    if (cells.length != header.length) {
      throw new IllegalStateException(file + ": " + line);
    }
    Map<String, String> byName = new LinkedHashMap<>();
    for (int i = 0; i < cells.length; i++) {
      byName.put(header[i], cells[i]);
    }
    return new Row(String.join(" ", List.of(cells).subList(0, Math.min(3, cells.length))), byName);
  }
}
