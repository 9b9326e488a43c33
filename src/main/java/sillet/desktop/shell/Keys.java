package sillet.desktop.shell;

import static javafx.scene.input.KeyCombination.ALT_DOWN;
import static javafx.scene.input.KeyCombination.SHORTCUT_DOWN;

import java.util.HashMap;
import java.util.Map;
import javafx.scene.Scene;
import javafx.scene.input.KeyCode;
import javafx.scene.input.KeyCodeCombination;
import javafx.scene.input.KeyCombination;
import javafx.scene.input.KeyEvent;
import sillet.desktop.controls.Screen;

/** The keys of the whole window, and those of the screen that is shown. */
final class Keys {
  /** What the window's own keys do. */
  interface Does {
    void bench();

    void instruments();

    void sets();

    void shop();

    void search();

    void keySheet();

    void back();
  }

  private final Scene scene;
  private Map<KeyCombination, Runnable> ofScreen = Map.of();

  /**
   * Teaches a scene its keys.
   *
   * @param scene of the window
   * @param does what the keys of places do
   * @param look what the keys of theme and text size change
   */
  Keys(Scene scene, Does does, WindowLook look) {
    this.scene = scene;
    Map<KeyCombination, Runnable> keys = new HashMap<>();
    keys.put(new KeyCodeCombination(KeyCode.DIGIT1, SHORTCUT_DOWN), does::bench);
    keys.put(new KeyCodeCombination(KeyCode.NUMPAD1, SHORTCUT_DOWN), does::bench);
    keys.put(new KeyCodeCombination(KeyCode.DIGIT2, SHORTCUT_DOWN), does::instruments);
    keys.put(new KeyCodeCombination(KeyCode.NUMPAD2, SHORTCUT_DOWN), does::instruments);
    keys.put(new KeyCodeCombination(KeyCode.DIGIT3, SHORTCUT_DOWN), does::sets);
    keys.put(new KeyCodeCombination(KeyCode.NUMPAD3, SHORTCUT_DOWN), does::sets);
    keys.put(new KeyCodeCombination(KeyCode.DIGIT4, SHORTCUT_DOWN), does::shop);
    keys.put(new KeyCodeCombination(KeyCode.NUMPAD4, SHORTCUT_DOWN), does::shop);
    keys.put(new KeyCodeCombination(KeyCode.F1), does::keySheet);
    keys.put(new KeyCodeCombination(KeyCode.F3), does::search);
    keys.put(new KeyCodeCombination(KeyCode.LEFT, ALT_DOWN), does::back);
    keys.put(new KeyCodeCombination(KeyCode.F9), look::nextTheme);
    for (KeyCode plus : new KeyCode[] {KeyCode.PLUS, KeyCode.EQUALS, KeyCode.ADD}) {
      keys.put(
          new KeyCodeCombination(plus, SHORTCUT_DOWN, KeyCombination.SHIFT_ANY), look::largerText);
    }
    for (KeyCode minus : new KeyCode[] {KeyCode.MINUS, KeyCode.SUBTRACT}) {
      keys.put(new KeyCodeCombination(minus, SHORTCUT_DOWN), look::smallerText);
    }
    keys.put(new KeyCodeCombination(KeyCode.DIGIT0, SHORTCUT_DOWN), look::usualText);
    scene.getAccelerators().putAll(keys);
    // not an accelerator: a screen may use the key first, to leave a cell for example
    scene.addEventHandler(
        KeyEvent.KEY_PRESSED,
        key -> {
          if (key.getCode() == KeyCode.ESCAPE) {
            does.back();
            key.consume();
          }
        });
  }

  /** Takes the keys of the screen before away and adds those of this one. */
  void of(Screen screen) {
    ofScreen.keySet().forEach(scene.getAccelerators()::remove);
    ofScreen = screen.keys();
    scene.getAccelerators().putAll(ofScreen);
  }
}
