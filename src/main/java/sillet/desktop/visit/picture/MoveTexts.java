package sillet.desktop.visit.picture;

import sillet.desktop.controls.Eighths;
import sillet.desktop.drawing.MarkShape;
import sillet.desktop.drawing.strings.Bridge;
import sillet.desktop.drawing.strings.Lie;
import sillet.desktop.drawing.strings.MoveText;
import sillet.desktop.drawing.strings.SaddleMark;
import sillet.desktop.drawing.strings.SheetShape;
import sillet.desktop.drawing.strings.StringsPicture;
import sillet.desktop.drawing.strings.WordColumns;
import sillet.desktop.visit.words.StringWords;
import sillet.logbook.moves.Direction;
import sillet.logbook.text.Texts;
import sillet.logbook.units.Figures;

/** Sets the words beside a string for the shape of the window. */
public final class MoveTexts {
  private static final String UNIT_SPACE = "\u00a0";

  private final Texts texts;
  private final StringsPicture picture;
  private final boolean oneLine;
  private final boolean headed;

  /**
   * Words for a picture.
   *
   * @param texts the words
   * @param picture beside which they stand
   * @param shape of the window
   */
  public MoveTexts(Texts texts, StringsPicture picture, SheetShape shape) {
    this.texts = texts;
    this.picture = picture;
    this.oneLine = WordColumns.of(shape, picture).line() == WordColumns.Line.ONE;
    this.headed = oneLine || shape == SheetShape.NARROW;
  }

  /** The words of one string. */
  public MoveText of(StringWords words) {
    MoveText text = words.kind().moves() ? move(words) : verdict(words);
    boolean pencil = words.kind().needsHand() && words.kind() != StringWords.Kind.MOVE;
    return pencil ? text.inPencil() : text;
  }

  private MoveText move(StringWords words) {
    boolean away = words.direction() == Direction.AWAY;
    Lie lie = picture.lie();
    MarkShape arrow = away == lie.bridgeLeft() ? MarkShape.ARROW_LEFT : MarkShape.ARROW_RIGHT;
    MoveText text = MoveText.move(arrow, figure(words), unit(words), head(words));
    String said = words.nut().isEmpty() ? words.range() : words.nut();
    String detail = words.sentence().isEmpty() ? said : words.sentence();
    String mm = onePiece() && !words.sentence().isEmpty() ? "" : mm(words);
    String left = words.nut().isEmpty() ? left(words) : "";
    return place(text.below(mm, detail, left), words);
  }

  /** On one line there is no room for a sentence: the verdict stands beside the direction. */
  private String head(StringWords words) {
    if (!oneLine || words.kind() == StringWords.Kind.MOVE) {
      return words.head();
    }
    return words.direction() == Direction.AWAY
        ? texts.say("visit.words.no-room-away")
        : texts.say("visit.words.no-room-toward");
  }

  private String figure(StringWords words) {
    if (onePiece()) {
      return "";
    }
    Eighths turns = words.turns();
    return turns == null ? words.mm() : turns.drawn();
  }

  private String unit(StringWords words) {
    if (onePiece()) {
      return "";
    }
    if (words.turns() == null) {
      return texts.say("visit.words.mm");
    }
    return headed ? "" : texts.say("visit.words.turns");
  }

  private String mm(StringWords words) {
    if (words.turns() == null && !onePiece()) {
      return "";
    }
    return oneLine ? words.mm() : words.mm() + UNIT_SPACE + texts.say("visit.words.mm");
  }

  private String left(StringWords words) {
    if (words.left().isEmpty() || headed) {
      return words.left();
    }
    return texts.say("visit.words.left", words.left());
  }

  private boolean onePiece() {
    return picture.bridge() instanceof Bridge.OnePiece;
  }

  private MoveText place(MoveText text, StringWords words) {
    SaddleMark saddle = picture.rows().get(words.string() - 1).saddle();
    if (!onePiece() || saddle == null) {
      return text;
    }
    Double target = saddle.reachableMm();
    double at = target == null ? saddle.nowMm() : target;
    return text.at(texts.say("visit.words.at"), Figures.fixed(at, 2));
  }

  private MoveText verdict(StringWords words) {
    MarkShape mark =
        switch (words.kind()) {
          case NOT_READ -> MarkShape.NOT_YET;
          case LEAVE -> MarkShape.LEAVE;
          case WITHIN -> MarkShape.INSIDE;
          case MADE -> MarkShape.DONE;
          case NOT_SOLVED, MOVE, NO_ROOM, SLOT -> MarkShape.READ_AGAIN;
        };
    MoveText text = MoveText.verdict(mark, words.head());
    if (words.kind() == StringWords.Kind.LEAVE) {
      String mm = oneLine ? words.mm() : words.mm() + UNIT_SPACE + texts.say("visit.words.mm");
      String little = headed ? texts.say("visit.words.less-short") : words.sentence();
      String why = words.nut().isEmpty() ? little : words.nut();
      return place(text.below(mm, why, ""), words);
    }
    return text.below("", words.sentence(), "");
  }
}
