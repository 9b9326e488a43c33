package sillet.store.saving;

import com.google.gson.Gson;
import com.google.gson.GsonBuilder;
import com.google.gson.TypeAdapter;
import com.google.gson.stream.JsonReader;
import com.google.gson.stream.JsonWriter;
import java.io.IOException;
import java.time.Instant;
import java.time.LocalDate;
import java.util.function.Function;
import sillet.logbook.moves.AimChoice;
import sillet.store.columns.Words;

/**
 * JSON as recorded actions are written in: every component by its name, also the empty ones, kinds
 * by their word, days and times as ISO 8601.
 */
final class ActionJson {
  private ActionJson() {}

  static Gson gson() {
    GsonBuilder builder =
        new GsonBuilder()
            .serializeNulls()
            .disableHtmlEscaping()
            .registerTypeAdapter(
                LocalDate.class, new AsText<>(LocalDate::toString, LocalDate::parse).nullSafe())
            .registerTypeAdapter(
                Instant.class, new AsText<>(Instant::toString, Instant::parse).nullSafe());
    builder.registerTypeAdapter(
        AimChoice.class, new AsText<>(AimChoice::word, AimChoice::parse).nullSafe());
    Words.all().forEach(words -> register(builder, words));
    return builder.create();
  }

  private static <E extends Enum<E>> void register(GsonBuilder builder, Words<E> words) {
    builder.registerTypeAdapter(words.type(), new AsText<>(words::write, words::read).nullSafe());
  }

  private static final class AsText<T> extends TypeAdapter<T> {
    private final Function<T, String> writes;
    private final Function<String, T> reads;

    AsText(Function<T, String> writes, Function<String, T> reads) {
      this.writes = writes;
      this.reads = reads;
    }

    @Override
    public void write(JsonWriter out, T value) throws IOException {
      out.value(writes.apply(value));
    }

    @Override
    public T read(JsonReader in) throws IOException {
      return reads.apply(in.nextString());
    }
  }
}
