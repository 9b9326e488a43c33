package sillet.desktop.shell;

import java.io.File;
import java.nio.file.Path;
import java.util.Optional;
import javafx.scene.control.ButtonBar.ButtonData;
import javafx.scene.control.ButtonType;
import javafx.stage.FileChooser;
import javafx.stage.Window;
import sillet.desktop.controls.Ask;
import sillet.logbook.text.Message;
import sillet.logbook.text.Texts;

/** Asks with the system's file window and with our own plain ones. */
final class SystemAsk implements Ask {
  private final Window owner;
  private final Dialogs dialogs;
  private final Texts texts;

  SystemAsk(Window owner, Dialogs dialogs, Texts texts) {
    this.owner = owner;
    this.dialogs = dialogs;
    this.texts = texts;
  }

  @Override
  public Optional<Path> fileToSave(String suggestedName) {
    FileChooser chooser = new FileChooser();
    chooser.setInitialFileName(suggestedName);
    return Optional.ofNullable(chooser.showSaveDialog(owner)).map(File::toPath);
  }

  @Override
  public Optional<Path> fileToOpen() {
    return Optional.ofNullable(new FileChooser().showOpenDialog(owner)).map(File::toPath);
  }

  @Override
  public boolean confirm(Message question) {
    ButtonType yes = new ButtonType(texts.say("shell.yes"), ButtonData.OK_DONE);
    ButtonType no = new ButtonType(texts.say("shell.no"), ButtonData.CANCEL_CLOSE);
    return dialogs
        .show(texts.say("shell.question"), texts.say(question), yes, no)
        .equals(Optional.of(yes));
  }

  @Override
  public void problem(Message what) {
    ButtonType read = new ButtonType(texts.say("shell.go-on"), ButtonData.OK_DONE);
    dialogs.show(texts.say("shell.trouble"), texts.say(what), read);
  }
}
