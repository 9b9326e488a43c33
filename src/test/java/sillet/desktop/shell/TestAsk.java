package sillet.desktop.shell;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import sillet.desktop.controls.Ask;
import sillet.logbook.text.Message;

/** Answers without a window and remembers what was said. */
final class TestAsk implements Ask {
  final List<Message> problems = new ArrayList<>();
  Optional<Path> file = Optional.empty();

  @Override
  public Optional<Path> fileToSave(String suggestedName) {
    return file;
  }

  @Override
  public Optional<Path> fileToOpen() {
    return file;
  }

  @Override
  public boolean confirm(Message question) {
    return true;
  }

  @Override
  public void problem(Message what) {
    problems.add(what);
  }
}
