package sillet.desktop.drawing;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import javafx.css.CssMetaData;
import javafx.css.SimpleStyleableObjectProperty;
import javafx.css.StyleConverter;
import javafx.css.Styleable;
import javafx.css.StyleableProperty;
import javafx.scene.canvas.Canvas;
import javafx.scene.canvas.GraphicsContext;
import javafx.scene.layout.Region;
import javafx.scene.paint.Color;
import sillet.desktop.theme.Looks;

/**
 * A region drawn with the pen. Colours and em come from the style sheets, so that a change of theme
 * or text size reaches the drawing without a line of code; it then draws itself anew.
 */
public abstract class Drawn extends Region {
  private static final List<DrawnProperty<?>> PROPERTIES =
      List.of(
          new DrawnProperty<Number>("em", StyleConverter.getSizeConverter(), 14.0),
          colour("ink", Color.BLACK),
          colour("soft", Color.BLACK),
          colour("line", Color.GRAY),
          colour("hair", Color.LIGHTGRAY),
          colour("pencil", Color.BLACK),
          colour("sheet", Color.WHITE),
          colour("field", Color.WHITE),
          colour("bench", Color.WHITE),
          colour("lamp", Color.WHITE));

  private static final List<CssMetaData<? extends Styleable, ?>> CSS_META_DATA = joined();

  private final Canvas canvas = new Canvas();
  private final List<SimpleStyleableObjectProperty<?>> values = new ArrayList<>();

  /** A drawing with nothing on it yet; drawings look like nothing until they stand in a scene. */
  protected Drawn() {
    for (DrawnProperty<?> property : PROPERTIES) {
      values.add(valueOf(property));
    }
    getStyleClass().add(Looks.DRAWN);
    canvas.setManaged(false);
    getChildren().add(canvas);
  }

  private <V> SimpleStyleableObjectProperty<V> valueOf(DrawnProperty<V> property) {
    var value =
        new SimpleStyleableObjectProperty<>(
            property, this, property.getProperty(), property.getInitialValue(this));
    value.addListener((seen, before, after) -> restyled());
    return value;
  }

  /** Draws everything onto a blank canvas of the given size in px. */
  protected abstract void draw(Pen pen, double width, double height);

  /** Called when the sheets changed em or a colour. Overrides call this too. */
  protected void restyled() {
    requestLayout();
  }

  /** Px of one em where this drawing stands. */
  public final double em() {
    return ((Number) values.get(0).getValue()).doubleValue();
  }

  private Color colourAt(int place) {
    return (Color) values.get(place).getValue();
  }

  private Inks inks() {
    return new Inks(
        colourAt(1),
        colourAt(2),
        colourAt(3),
        colourAt(4),
        colourAt(5),
        colourAt(6),
        colourAt(7),
        colourAt(8),
        colourAt(9));
  }

  @Override
  protected void layoutChildren() {
    canvas.setWidth(Math.ceil(getWidth()));
    canvas.setHeight(Math.ceil(getHeight()));
    GraphicsContext context = canvas.getGraphicsContext2D();
    context.clearRect(0, 0, canvas.getWidth(), canvas.getHeight());
    if (getWidth() > 0 && getHeight() > 0) {
      draw(new Pen(context, inks(), em(), pixelsPerUnit()), getWidth(), getHeight());
    }
  }

  private double pixelsPerUnit() {
    var scene = getScene();
    return scene == null || scene.getWindow() == null ? 1 : scene.getWindow().getOutputScaleX();
  }

  @Override
  public List<CssMetaData<? extends Styleable, ?>> getCssMetaData() {
    return CSS_META_DATA;
  }

  private static DrawnProperty<Color> colour(String name, Color initial) {
    return new DrawnProperty<>(name, StyleConverter.getColorConverter(), initial);
  }

  private static List<CssMetaData<? extends Styleable, ?>> joined() {
    List<CssMetaData<? extends Styleable, ?>> all = new ArrayList<>(Region.getClassCssMetaData());
    all.addAll(PROPERTIES);
    return Collections.unmodifiableList(all);
  }

  /** One value that the sheets set on a drawing: {@code -drawn-} and its name. */
  private static final class DrawnProperty<V> extends CssMetaData<Drawn, V> {
    DrawnProperty(String name, StyleConverter<?, V> converter, V initial) {
      super("-drawn-" + name, converter, initial);
    }

    @Override
    public boolean isSettable(Drawn drawn) {
      return true;
    }

    @Override
    @SuppressWarnings("unchecked") // values stand in the order of the properties
    public StyleableProperty<V> getStyleableProperty(Drawn drawn) {
      return (StyleableProperty<V>) drawn.values.get(PROPERTIES.indexOf(this));
    }
  }
}
