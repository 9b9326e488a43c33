package sillet.desktop.shell;

import java.util.function.Consumer;
import java.util.function.UnaryOperator;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import sillet.desktop.controls.Background;
import sillet.desktop.theme.TextSize;
import sillet.logbook.text.Message;

/** Theme and text size: changed by keys, kept in a file, and a failure to keep them is said. */
final class WindowLook {
  private final ReadOnlyObjectWrapper<Settings> settings =
      new ReadOnlyObjectWrapper<>(this, "settings", Settings.USUAL);
  private final SettingsFile file;
  private final Background background;
  private final Consumer<Message> notKept;

  /**
   * A look as usual, until {@link #fetch} has read the file.
   *
   * @param file where it is kept
   * @param background where files are written
   * @param notKept takes the sentence when it could not be kept
   */
  WindowLook(SettingsFile file, Background background, Consumer<Message> notKept) {
    this.file = file;
    this.background = background;
    this.notKept = notKept;
  }

  ReadOnlyObjectProperty<Settings> settingsProperty() {
    return settings.getReadOnlyProperty();
  }

  /** Reads what was kept. */
  void fetch() {
    background.run(file::fetch, settings::set, notKept);
  }

  void nextTheme() {
    change(now -> now.with(now.theme().next()));
  }

  void largerText() {
    change(now -> now.with(now.textSize().larger()));
  }

  void smallerText() {
    change(now -> now.with(now.textSize().smaller()));
  }

  void usualText() {
    change(now -> now.with(TextSize.USUAL));
  }

  private void change(UnaryOperator<Settings> how) {
    Settings after = how.apply(settings.get());
    if (after.equals(settings.get())) {
      return;
    }
    settings.set(after);
    background.run(() -> file.keep(after), kept -> {}, notKept);
  }
}
