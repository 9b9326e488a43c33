package sillet.store.saving;

import com.google.gson.JsonArray;
import com.google.gson.JsonElement;
import com.google.gson.JsonObject;
import com.google.gson.JsonPrimitive;
import sillet.logbook.text.Quoted;
import sillet.logbook.text.Rejection;

/**
 * Refuses the few texts that not every database and file can hold: a NUL character, and half of a
 * pair of code units, which no encoding can write.
 */
final class KeepableText {
  private KeepableText() {}

  static void check(JsonElement values) {
    if (values instanceof JsonObject object) {
      object.asMap().values().forEach(KeepableText::check);
    } else if (values instanceof JsonArray array) {
      array.forEach(KeepableText::check);
    } else if (values instanceof JsonPrimitive primitive && primitive.isString()) {
      check(primitive.getAsString());
    }
  }

  static void check(String text) {
    if (text.indexOf('\0') >= 0) {
      throw Rejection.of("text.nul", Quoted.of(text));
    }
    if (text.codePoints().anyMatch(KeepableText::half)) {
      throw Rejection.of("text.half", Quoted.of(text));
    }
  }

  private static boolean half(int point) {
    return point >= Character.MIN_SURROGATE && point <= Character.MAX_SURROGATE;
  }
}
