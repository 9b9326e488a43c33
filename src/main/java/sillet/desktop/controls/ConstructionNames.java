package sillet.desktop.controls;

import java.util.Locale;
import javafx.util.StringConverter;
import sillet.acoustics.wire.Construction;
import sillet.logbook.strings.ConstructionWords;

/** How constructions are named in a list to choose from: the words of the files, unhyphened. */
public final class ConstructionNames extends StringConverter<Construction> {
  @Override
  public String toString(Construction construction) {
    return construction == null ? "" : ConstructionWords.of(construction).replace('-', ' ');
  }

  @Override
  public Construction fromString(String typed) {
    throw new UnsupportedOperationException(typed.toLowerCase(Locale.ROOT));
  }
}
