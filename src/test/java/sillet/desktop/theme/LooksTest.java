package sillet.desktop.theme;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.lang.reflect.Field;
import java.lang.reflect.Modifier;
import java.util.Arrays;
import java.util.List;
import javafx.css.PseudoClass;
import org.junit.jupiter.api.Test;

class LooksTest {
  private static <T> List<T> constants(Class<T> type) {
    return Arrays.stream(Looks.class.getFields())
        .filter(field -> Modifier.isStatic(field.getModifiers()) && field.getType() == type)
        .map(field -> type.cast(valueOf(field)))
        .toList();
  }

  private static Object valueOf(Field field) {
    try {
      return field.get(null);
    } catch (IllegalAccessException e) {
      throw new AssertionError(field + " should be public", e);
    }
  }

  @Test
  void everyStyleClassStandsInTheSheet() throws IOException {
    String sheet = new SheetFile("sillet.css").text();
    assertThat(constants(String.class))
        .hasSizeGreaterThan(30)
        .allMatch(name -> sheet.matches("(?s).*\\." + name + "[ ,:{>].*"));
  }

  @Test
  void everyStateStandsInTheSheet() throws IOException {
    String sheet = new SheetFile("sillet.css").text();
    assertThat(constants(PseudoClass.class))
        .hasSize(5)
        .allMatch(state -> sheet.contains(":" + state.getPseudoClassName()));
  }
}
