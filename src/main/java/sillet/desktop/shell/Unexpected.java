package sillet.desktop.shell;

import java.nio.charset.StandardCharsets;
import java.util.Locale;
import java.util.function.Consumer;
import java.util.zip.CRC32;
import javafx.scene.control.Button;
import javafx.scene.control.ButtonType;
import javafx.scene.control.Label;
import javafx.scene.control.TextField;
import javafx.scene.input.Clipboard;
import javafx.scene.input.ClipboardContent;
import javafx.scene.layout.HBox;
import javafx.scene.layout.VBox;
import org.slf4j.Logger;
import org.slf4j.LoggerFactory;
import sillet.desktop.theme.Looks;
import sillet.logbook.text.Texts;

/**
 * The one window for what nobody foresaw. It shows a short code that can be copied; the same
 * failure at the same place has the same code. The whole story goes to the log. Call on the
 * window's thread.
 */
final class Unexpected implements Consumer<Throwable> {
  private static final Logger LOG = LoggerFactory.getLogger(Unexpected.class);

  private final Dialogs dialogs;
  private final Texts texts;
  private boolean showing;

  Unexpected(Dialogs dialogs, Texts texts) {
    this.dialogs = dialogs;
    this.texts = texts;
  }

  @Override
  public void accept(Throwable trouble) {
    String code = code(trouble);
    LOG.error("Unexpected, code {}", code, trouble);
    if (showing) {
      return;
    }
    showing = true;
    try {
      ButtonType close = new ButtonType(texts.say("shell.go-on"));
      dialogs.show(texts.say("shell.unexpected-head"), body(code), close);
    } finally {
      showing = false;
    }
  }

  /** Eight characters from the kind of failure and the place in the program. */
  static String code(Throwable trouble) {
    CRC32 sum = new CRC32();
    Throwable root = trouble;
    for (int depth = 0; root.getCause() != null && depth < 20; depth++) {
      root = root.getCause();
    }
    StringBuilder story = new StringBuilder(root.getClass().getName());
    StackTraceElement[] frames = root.getStackTrace();
    for (int i = 0; i < Math.min(frames.length, 3); i++) {
      story.append(' ').append(frames[i]);
    }
    sum.update(story.toString().getBytes(StandardCharsets.UTF_8));
    long value = sum.getValue();
    return String.format(Locale.ROOT, "%04X-%04X", value >>> 16, value & 0xFFFF);
  }

  private VBox body(String code) {
    Label sentence = new Label(texts.say("shell.unexpected"));
    sentence.setWrapText(true);
    sentence.getStyleClass().add(Looks.SENTENCE);
    TextField field = new TextField(code);
    field.setEditable(false);
    field.setAccessibleText(texts.say("shell.code"));
    Button copy = new Button(texts.say("shell.copy"));
    copy.setOnAction(
        pressed -> {
          ClipboardContent content = new ClipboardContent();
          content.putString(code);
          Clipboard.getSystemClipboard().setContent(content);
        });
    HBox line = new HBox(new Label(texts.say("shell.code")), field, copy);
    line.getStyleClass().add("dialog-line");
    VBox body = new VBox(sentence, line);
    body.getStyleClass().add("dialog-said");
    return body;
  }
}
