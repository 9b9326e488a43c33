package sillet.desktop.shell;

import java.nio.file.Path;
import java.time.Clock;
import java.time.ZoneId;
import java.util.function.UnaryOperator;
import javafx.application.Application;
import javafx.stage.Stage;
import org.jspecify.annotations.Nullable;
import sillet.desktop.theme.Fonts;
import sillet.store.place.LogbookPlace;

/** What the toolkit starts; {@link SilletWindow} is the way in. */
public final class WindowApplication extends Application {
  private @Nullable ShopWindow window;

  /** Made by the toolkit. */
  public WindowApplication() {}

  @Override
  public void start(Stage stage) {
    Fonts.load();
    LogbookPlace own = new LogbookPlace(Path.of(getParameters().getRaw().get(0)));
    Clock clock = Clock.system(ZoneId.systemDefault());
    ShopWindow opened = new ShopWindow(stage, own, clock, UnaryOperator.identity());
    window = opened;
    opened.open();
  }

  @Override
  public void stop() {
    if (window != null) {
      window.ended();
    }
  }
}
