package sillet.desktop.visit;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import javafx.scene.Node;
import javafx.scene.control.Button;
import javafx.scene.layout.Priority;
import javafx.scene.layout.Region;
import javafx.scene.layout.VBox;
import sillet.desktop.controls.KeyHint;
import sillet.desktop.drawing.strings.SheetShape;
import sillet.desktop.visit.aim.AimBar;
import sillet.desktop.visit.checks.ChecksModel;
import sillet.desktop.visit.checks.ChecksPanel;
import sillet.desktop.visit.checks.RoomModel;
import sillet.desktop.visit.checks.RoomPanel;
import sillet.desktop.visit.readings.Cell;
import sillet.desktop.visit.words.FindingLine;
import sillet.desktop.visit.words.StringWords;
import sillet.logbook.actions.Action;
import sillet.logbook.actions.HandOut;
import sillet.logbook.instruments.SaddleKind;
import sillet.logbook.text.Message;
import sillet.logbook.text.Texts;
import sillet.logbook.units.LengthUnit;
import sillet.logbook.visits.VisitRecord;

/** The panels of one loaded visit and what happens between them. */
final class VisitParts {
  private final VisitDesk desk;
  private final VisitModel model;
  private final Texts texts;
  private final WordsOfVisit said;
  private final VisitHead head;
  private final ReadingsPanel readings;
  private final ReadingsFoot foot;
  private final FindingsPanel findings;
  private final BridgePanel bridge;
  private final ChecksModel checks;
  private final ChecksPanel checksPanel;
  private final RoomModel room;
  private final RoomPanel roomPanel;
  private final LogPart log;
  private final Button handOut;
  private final MadeMode made;
  private final SectionWords sections;
  private final VisitPage page;
  private SheetShape shape = SheetShape.USUAL;
  private double shapedEm;
  private boolean placed;
  private int shownPass;

  VisitParts(VisitDesk desk, WordsOfVisit said, List<Button> leadOn) {
    this.desk = desk;
    this.model = desk.model();
    this.texts = desk.texts();
    this.said = said;
    this.shownPass = model.pass();
    VisitRecord record = model.record();
    LengthUnit unit = desk.desk().atBench().shop().lengthUnit();
    this.head = new VisitHead(texts);
    this.readings = new ReadingsPanel(desk, said, this::showReadings);
    this.foot =
        new ReadingsFoot(
            desk,
            new ReadingsFoot.Changed(
                this::remade, this::showReadings, this::turnNeck, this::aimed));
    readings.getChildren().add(foot);
    this.findings = new FindingsPanel(texts);
    this.bridge = new BridgePanel(texts);
    this.checks = new ChecksModel(record, unit, new UnusualCheck(unit));
    this.checksPanel =
        new ChecksPanel(
            checks, texts, (row, moment) -> keep(checks.commit(row, moment, model.visitId())));
    this.room = new RoomModel(record, unit);
    this.roomPanel = new RoomPanel(room, texts, row -> keep(room.commit(row, model.visitId())));
    this.handOut =
        KeyHint.button(texts.say("visit.hand-out"), texts.say("visit.key.hand-out"), this::handOut);
    handOut.setId("hand-out");
    List<Button> buttons = new ArrayList<>(leadOn);
    buttons.add(handOut);
    this.log = new LogPart(desk, buttons);
    this.made = new MadeMode(desk, readings, this::refresh);
    this.sections = new SectionWords(sections());
    List<Region> below = List.of(checksPanel, findings, log.work());
    VBox saddles = new VBox(bridge, roomPanel);
    saddles.getStyleClass().add("panels");
    VBox.setVgrow(roomPanel, Priority.ALWAYS);
    this.page = new VisitPage(head, sections, readings, below, List.of(saddles, log.notes()));
    refresh();
  }

  Node node() {
    return page;
  }

  private List<Section> sections() {
    return List.of(
        new Section(
            "readings", texts.say("visit.readings"), readings, this::focusStart, states()::read),
        new Section(
            "findings",
            texts.say("visit.findings"),
            findings,
            findings::requestFocus,
            states()::found),
        new Section(
            "checks", texts.say("visit.checks"), checksPanel, into(checksPanel), states()::checked),
        new Section("room", texts.say("visit.room"), roomPanel, into(roomPanel), states()::room),
        new Section(
            "work", texts.say("visit.work"), log.work(), log.work()::focus, states()::worked),
        new Section(
            "notes", texts.say("visit.notes"), log.notes(), log.notes()::focus, states()::noted),
        new Section(
            "hand-out",
            texts.say("visit.hand-out"),
            handOut,
            handOut::requestFocus,
            states()::out));
  }

  private SectionStates states() {
    return new SectionStates(texts, model, checks, said);
  }

  private static Runnable into(Region panel) {
    return () -> {
      Node field = panel.lookup(".check-cell");
      if (field != null) {
        field.requestFocus();
      }
    };
  }

  private void keep(Optional<? extends Action> action) {
    action.ifPresent(desk.saves()::keep);
  }

  /** Closes the visit, once the technician has said so. */
  void handOut() {
    if (!model.open()) {
      return;
    }
    String ticket = Integer.toString(model.record().visit().ticket());
    String name = model.record().instrument().name();
    if (desk.desk().ask().confirm(Message.of("visit.hand-out.sure", ticket, name))) {
      keep(Optional.of(new HandOut(model.visitId(), LocalDate.now(desk.clock()))));
    }
  }

  /** Takes what the logbook now holds. */
  void take(VisitRecord now) {
    boolean wasOpen = model.open();
    model.take(now);
    checks.take(now);
    room.take(now);
    log.take(now);
    if (model.pass() != shownPass) {
      remade();
      focusStart();
    }
    if (wasOpen != model.open()) {
      readings.editable(model.open());
      checksPanel.editable(model.open());
      roomPanel.make(model.open());
    }
    refresh();
  }

  /** Looks at another pass. */
  void look(int pass) {
    made.end();
    model.look(pass);
    remade();
  }

  private void remade() {
    shownPass = model.pass();
    readings.makeCells();
    refresh();
  }

  /** Shows everything as it now is. */
  private void refresh() {
    readings.title(PassChoices.of(model, texts, this::look));
    log.show(model.open());
    handOut.setDisable(!model.open());
    head.show(model, shape);
    showReadings();
  }

  /** Shows what a key can change, and no more: it happens at every key. */
  private void showReadings() {
    List<FindingLine> found = said.findings(model);
    List<StringWords> words = said.of(model);
    readings.refresh(found, words);
    boolean moving = words.stream().anyMatch(string -> string.kind().moves());
    boolean unread = model.strings().stream().allMatch(string -> string.advice() == null);
    String none = texts.say(unread ? "visit.findings.begin" : "visit.findings.none");
    boolean onePiece = model.record().instrument().saddle().kind() == SaddleKind.ONE_PIECE;
    String caution = texts.say(onePiece ? "visit.caution.file" : "visit.caution.tension");
    findings.show(new FindingsPanel.Shown(found, none, moving || made.on() ? caution : ""));
    foot.refresh(readings.neck());
    bridge.show(said.bridge(model));
    made.showButtons();
    sections.refresh(shape == SheetShape.NARROW);
  }

  /** Takes the shape that goes with a width of the window in px. */
  void width(double widthPx) {
    double em = readings.em();
    SheetShape wanted = SheetShape.forWindow(widthPx / em);
    if (placed && wanted == shape && em == shapedEm) {
      return;
    }
    placed = true;
    shape = wanted;
    shapedEm = em;
    readings.setShape(wanted);
    page.setShape(wanted, em);
    checksPanel.setNarrow(wanted == SheetShape.WIDE);
    head.show(model, wanted);
    sections.refresh(wanted == SheetShape.NARROW);
  }

  /** Puts the focus where the hand goes first. */
  void focusStart() {
    Cell start = model.walk().start(model.grid()::read);
    readings.focus(start);
  }

  void focused(Node node) {
    sections.current(node);
  }

  void walk(Node focused, int step) {
    sections.walk(focused, step);
  }

  /** Writes the job sheet and says where it is. */
  void export(JobSheetExport export, int ticket) {
    export.write(ticket, said -> log.work().say(texts.say(said)));
  }

  /** The whole neck, or cells beside their frets. */
  void turnNeck() {
    readings.showWholeNeck(!readings.neck().whole());
    showReadings();
  }

  /** The key does nothing where the cells have no room beside their frets. */
  void neckByKey() {
    if (!readings.neck().crowded()) {
      turnNeck();
    }
  }

  private void aimed() {
    made.end();
    refresh();
    readings.placeWords();
  }

  AimBar aim() {
    return foot.aim();
  }

  void turnAbout() {
    readings.turnAbout();
  }

  MadeMode made() {
    return made;
  }

  void focusWork() {
    log.work().focus();
  }

  void focusNotes() {
    log.notes().focus();
  }
}
