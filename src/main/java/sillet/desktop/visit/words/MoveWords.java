package sillet.desktop.visit.words;

import java.util.Set;
import org.jspecify.annotations.Nullable;
import sillet.desktop.controls.Eighths;
import sillet.desktop.visit.readings.CentsText;
import sillet.logbook.moves.Direction;
import sillet.logbook.moves.MoveAdvice;
import sillet.logbook.moves.MoveFigures;
import sillet.logbook.moves.Verdict;
import sillet.logbook.text.Message;
import sillet.logbook.text.Texts;
import sillet.logbook.units.Figures;
import sillet.logbook.visits.MoveProof;
import sillet.logbook.visits.StringPass;

/** Turns the advice on a string into the words beside it. */
public final class MoveWords {
  private static final int MM_DECIMALS = 2;
  private static final int LEFT_DECIMALS = 1;

  private static final Set<String> CUT_SHORT =
      Set.of("move.no-room-away", "move.no-room-toward", "move.slot-away", "move.slot-toward");

  /** Where these messages say what stays at fret 12. */
  private static final int STAYS = 2;

  private final Texts texts;

  public MoveWords(Texts texts) {
    this.texts = texts;
  }

  /**
   * The words for a string.
   *
   * @param string in the pass that is looked at
   * @param before the same string in the pass before; null in the first
   */
  public StringWords of(StringPass string, @Nullable StringPass before) {
    Double made = string.madeMm();
    MoveAdvice advice = string.advice();
    if (made != null) {
      return made(string, made);
    }
    if (advice == null) {
      return notRead(string, before);
    }
    MoveFigures figures = advice.figures();
    if (figures == null) {
      String why = advice.notes().isEmpty() ? "" : texts.say(advice.notes().get(0));
      return plain(string, StringWords.Kind.NOT_SOLVED, texts.say("visit.words.not-solved"), why);
    }
    MoveProof proof = string.proof();
    if (proof != null && proof.withinOneCent()) {
      return plain(
          string,
          StringWords.Kind.WITHIN,
          texts.say("visit.words.within"),
          texts.say(
              "visit.words.before-now",
              CentsText.of(proof.centsBefore()),
              CentsText.of(proof.centsNow())));
    }
    return read(string, advice, figures);
  }

  private StringWords read(StringPass string, MoveAdvice advice, MoveFigures figures) {
    return switch (advice.verdict()) {
      case LEAVE ->
          new StringWords(
              number(string),
              StringWords.Kind.LEAVE,
              Direction.STAY,
              null,
              nut(string, figures).isEmpty()
                  ? texts.say("visit.words.leave")
                  : texts.say("visit.words.leave-saddle"),
              mm(Math.abs(figures.saddleMm())),
              "",
              nut(string, figures),
              "",
              texts.say("visit.words.less"));
      case MOVE -> move(string, figures);
      case NO_ROOM, SLOT -> cutShort(string, advice, figures);
    };
  }

  private StringWords move(StringPass string, MoveFigures figures) {
    double size = Math.abs(figures.saddleMm());
    double least = Math.min(Math.abs(figures.lowMm()), Math.abs(figures.highMm()));
    double most = Math.max(Math.abs(figures.lowMm()), Math.abs(figures.highMm()));
    Double room = string.string().room().toward(figures.saddleMm());
    return new StringWords(
        number(string),
        StringWords.Kind.MOVE,
        figures.direction(),
        turns(string, size),
        way(figures.direction()),
        mm(size),
        texts.say("visit.words.range", mm(least), mm(most)),
        nut(string, figures),
        room == null ? "" : Figures.fixed(Math.max(0, room - size), LEFT_DECIMALS),
        "");
  }

  /** A move that does not fit: what is possible stands first, then what is missing. */
  private StringWords cutShort(StringPass string, MoveAdvice advice, MoveFigures figures) {
    Double room = string.string().room().toward(figures.saddleMm());
    double possible = room == null ? 0 : room;
    String missing = mm(Math.abs(figures.saddleMm()) - possible);
    boolean slot = advice.verdict() == Verdict.SLOT;
    String stays = stays(advice, figures.direction());
    String sentence;
    if (!slot) {
      sentence = texts.say("visit.words.no-room", missing);
    } else if (stays.isEmpty()) {
      sentence = texts.say("visit.words.slot-only", missing);
    } else {
      sentence = texts.say("visit.words.slot", missing, stays);
    }
    return new StringWords(
        number(string),
        slot ? StringWords.Kind.SLOT : StringWords.Kind.NO_ROOM,
        figures.direction(),
        turns(string, possible),
        way(figures.direction()),
        mm(possible),
        "",
        nut(string, figures),
        "",
        sentence);
  }

  /** What a saddle that cannot go back far enough leaves is sharp, the other way flat. */
  private static String stays(MoveAdvice advice, Direction wanted) {
    for (Message note : advice.notes()) {
      if (CUT_SHORT.contains(note.key()) && !note.values().get(STAYS).isEmpty()) {
        double cents = Double.parseDouble(note.values().get(STAYS));
        return CentsText.of(wanted == Direction.AWAY ? cents : -cents);
      }
    }
    return "";
  }

  private static @Nullable Eighths turns(StringPass string, double mm) {
    Double screw = string.string().room().screwMm();
    Eighths turns = screw == null ? null : Eighths.of(mm / screw);
    return turns == null || turns.none() ? null : turns;
  }

  private StringWords notRead(StringPass string, @Nullable StringPass before) {
    Double moved = before == null ? null : before.madeMm();
    String sentence = "";
    if (moved != null) {
      sentence =
          moved > 0
              ? texts.say("visit.words.moved-away", mm(moved))
              : texts.say("visit.words.moved-toward", mm(-moved));
    }
    return plain(string, StringWords.Kind.NOT_READ, texts.say("visit.words.not-read"), sentence);
  }

  private StringWords made(StringPass string, double madeMm) {
    String head =
        madeMm > 0
            ? texts.say("visit.words.moved-away", mm(madeMm))
            : texts.say("visit.words.moved-toward", mm(-madeMm));
    Double predicted = string.predictedCents();
    MoveFigures figures = string.advice() == null ? null : string.advice().figures();
    String sentence =
        predicted == null || figures == null
            ? ""
            : texts.say(
                "visit.words.before-expected",
                CentsText.of(figures.cents12Before()),
                CentsText.of(predicted));
    return plain(string, StringWords.Kind.MADE, head, sentence);
  }

  private StringWords plain(
      StringPass string, StringWords.Kind kind, String head, String sentence) {
    return new StringWords(
        number(string), kind, Direction.STAY, null, head, "", "", "", "", sentence);
  }

  /** What the nut shall do, where it can and that is enough to be seen. */
  private String nut(StringPass string, MoveFigures figures) {
    Double nut = figures.nutMm();
    if (nut == null || mm(Math.abs(nut)).equals(mm(0))) {
      return "";
    }
    if (!string.string().readings().knowTheNut()) {
      return texts.say("visit.words.nut-guess");
    }
    return nut > 0
        ? texts.say("visit.words.nut-toward-bridge", mm(nut))
        : texts.say("visit.words.nut-away", mm(-nut));
  }

  private String way(Direction direction) {
    return texts.say(direction.key());
  }

  private static int number(StringPass string) {
    return string.string().string().number();
  }

  private static String mm(double mm) {
    return Figures.fixed(mm, MM_DECIMALS);
  }
}
