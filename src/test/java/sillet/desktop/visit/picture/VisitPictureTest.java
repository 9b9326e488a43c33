package sillet.desktop.visit.picture;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.Test;
import sillet.desktop.drawing.strings.Bridge;
import sillet.desktop.drawing.strings.FindingMark;
import sillet.desktop.drawing.strings.FretMark;
import sillet.desktop.drawing.strings.SaddleMark;
import sillet.desktop.drawing.strings.StringRow;
import sillet.desktop.drawing.strings.StringsPicture;
import sillet.desktop.visit.SampleVisits;
import sillet.desktop.visit.TestVisits;
import sillet.desktop.visit.words.FindingLine;
import sillet.desktop.visit.words.FindingSpot;
import sillet.logbook.instruments.Neck;
import sillet.logbook.instruments.Saddle;
import sillet.logbook.instruments.SaddleKind;
import sillet.logbook.instruments.ScrewSense;
import sillet.logbook.moves.MoveAdvisor;
import sillet.logbook.moves.MoveFigures;
import sillet.logbook.strings.FittedString;
import sillet.logbook.text.Texts;
import sillet.logbook.visits.StringPass;
import sillet.logbook.visits.Travel;
import sillet.logbook.visits.VisitMoves;
import sillet.logbook.visits.VisitRecord;

class VisitPictureTest {
  private static final ShownNeck FRETS = ShownNeck.cells(List.of(1, 5, 12));
  private static final Travel ROOM = new Travel(1, 6.5, 1.0);

  private static List<List<StringPass>> passes(VisitRecord record) {
    return VisitMoves.of(record, new MoveAdvisor(75));
  }

  private static StringsPicture picture(VisitRecord record, int pass, FindingLine... findings) {
    return new VisitPicture(record.instrument(), passes(record), pass, FRETS, Texts.english())
        .make(List.of(findings), false);
  }

  private static FretMark at12(StringRow row) {
    return row.frets().get(2);
  }

  @Test
  void drawsTheSaddleTheTargetItsIntervalAndTheTravel() {
    VisitRecord record = TestVisits.read(TestVisits.six(List.of(ROOM)), 1, "5.0");
    MoveFigures figures = passes(record).get(0).get(0).advice().figures();
    SaddleMark saddle = picture(record, 1).rows().get(0).saddle();
    assertThat(saddle.nowMm()).isEqualTo(figures.setbackMm());
    assertThat(saddle.targetMm()).isEqualTo(figures.setbackMm() + figures.saddleMm());
    assertThat(saddle.lowMm()).isEqualTo(figures.setbackMm() + figures.lowMm());
    assertThat(saddle.travelAwayMm() - saddle.nowMm()).isCloseTo(6.5, within(1e-9));
    assertThat(saddle.nowMm() - saddle.travelNeckMm()).isCloseTo(1.0, within(1e-9));
    assertThat(picture(record, 1).rows().get(1).saddle()).as("not read, not known").isNull();
  }

  @Test
  void expectsFretTwelveTrueAndTheOthersInProportion() {
    VisitRecord record = TestVisits.read(TestVisits.six(List.of()), 1, "5.0");
    FretMark mark = at12(picture(record, 1).rows().get(0));
    assertThat(mark.cents()).isEqualTo(5.0);
    assertThat(mark.predicted()).isCloseTo(0, within(0.05));
  }

  @Test
  void expectsNoMoreThanTheTravelLets() {
    VisitRecord record =
        TestVisits.read(TestVisits.six(List.of(new Travel(1, 0.93, 1.0))), 1, "5.0");
    assertThat(at12(picture(record, 1).rows().get(0)).predicted()).isCloseTo(2.5, within(0.05));
  }

  @Test
  void showsTheOldPlaceAndReadingInTheSecondPassWhereverTheSecondReadingPutsIt() {
    VisitRecord moved =
        TestVisits.moved(TestVisits.read(TestVisits.six(List.of(ROOM)), 1, "5.0"), 1, 1, 1.86);
    double before = picture(moved, 1).rows().get(0).saddle().nowMm();
    VisitRecord again = TestVisits.read(moved, 2, "0.3");
    StringRow row = picture(again, 2).rows().get(0);
    assertThat(row.saddle().beforeMm()).isCloseTo(before, within(1e-9));
    assertThat(row.saddle().nowMm()).isCloseTo(before + 1.86, within(1e-9));
    assertThat(row.saddle().targetMm()).as("within 1 cent: nothing to do").isNull();
    assertThat(row.saddle().travelAwayMm() - row.saddle().nowMm())
        .isCloseTo(6.5 - 1.86, within(1e-9));
    assertThat(at12(row).before()).isEqualTo(5.0);
    assertThat(at12(row).cents()).isEqualTo(0.3);
  }

  @Test
  void pairsCoursesOfUnisonsAndOctavesOnly() {
    VisitRecord twelve =
        TestVisits.of(
            SampleVisits.electric("A", "Twelve", neck(12), screws()),
            SampleVisits.strings(
                648,
                "E4 .010 p",
                "E4 .010 p",
                "B3 .013 p",
                "B3 .013 p",
                "G3 .017 p",
                "G4 .008 p",
                "D3 .026 w",
                "D4 .012 p",
                "A2 .036 w",
                "A3 .018 p",
                "E2 .046 w",
                "E3 .026 w"));
    assertThat(picture(twelve, 1).rows())
        .extracting(StringRow::course)
        .containsExactly(1, 1, 2, 2, 3, 3, 4, 4, 5, 5, 6, 6);
    VisitRecord eight =
        TestVisits.of(
            SampleVisits.electric("A", "Eight", neck(8), screws()),
            SampleVisits.strings(
                684,
                "E4 .010 p",
                "B3 .013 p",
                "G3 .017 p",
                "D3 .026 w",
                "A2 .036 w",
                "E2 .046 w",
                "B1 .062 w",
                "F#1 .074 w"));
    assertThat(picture(eight, 1).rows()).extracting(StringRow::course).containsOnly(0);
  }

  /** Fret 5 lies at 2^(-5/12) of the scale: equal temperament. */
  @Test
  void letsAShortFifthStringBeginAtItsOwnNut() {
    List<FittedString> four =
        SampleVisits.strings(670, "D4 .010 p", "B3 .012 p", "G3 .014 p", "D3 .023 w");
    FittedString fifth = SampleVisits.strings(670 * Math.pow(2, -5 / 12.0), "G4 .010 p").get(0);
    List<FittedString> strings = new java.util.ArrayList<>(four);
    strings.add(new FittedString(5, fifth.pitch(), fifth.scaleMm(), fifth.make()));
    Neck neck = new Neck(5, 670, 670, 22, null, false);
    StringsPicture banjo =
        picture(TestVisits.of(SampleVisits.electric("A", "Banjo", neck, screws()), strings), 1);
    assertThat(banjo.rows()).extracting(StringRow::startFret).containsExactly(0, 0, 0, 0, 5);
    assertThat(banjo.board().readFrets()).containsExactly(1, 5, 6, 10, 12, 17);
  }

  @Test
  void measuresAOnePieceSaddleFromItsFrontEdge() {
    Saddle bone = new Saddle(SaddleKind.ONE_PIECE, null, ScrewSense.NOT_KNOWN, 3.2);
    VisitRecord record =
        TestVisits.read(
            TestVisits.visit(
                SampleVisits.electric("A", "Bone", neck(6), bone),
                SampleVisits.sixStrings(648),
                List.of(new Travel(1, 1.2, 1.2))),
            1,
            "2.0");
    StringsPicture picture = picture(record, 1);
    assertThat(picture.bridge()).isInstanceOf(Bridge.OnePiece.class);
    assertThat(picture.rows().get(0).saddle().nowMm()).isCloseTo(1.6, within(1e-9));
    assertThat(picture.rows().get(0).saddle().travelAwayMm()).isCloseTo(2.8, within(1e-9));
    assertThat(picture.rows().get(1).saddle()).isNull();
  }

  @Test
  void marksAFindingAtItsStrings() {
    VisitRecord record = TestVisits.read(TestVisits.six(List.of()), 1, "5.0", "3.0", "2.0");
    FindingLine wild = line(FindingSpot.Part.NOTE, "A try lies apart", 1, 3);
    FindingLine room = line(FindingSpot.Part.SADDLE, "No room", 2);
    assertThat(picture(record, 1, wild, room).findings())
        .containsExactly(
            new FindingMark(1, 0, 12, "A try lies apart"),
            new FindingMark(1, 2, 12, "A try lies apart"),
            new FindingMark(2, 1, FindingMark.AT_SADDLE, "No room"));
  }

  @Test
  void marksCausesAtNutFretAndString() {
    VisitRecord record = TestVisits.read(TestVisits.six(List.of()), 1, "5.0");
    FindingLine fret =
        new FindingLine(
            List.of(), new FindingSpot(FindingSpot.Part.FRET, 7), "Fret 7", "", "", "", "");
    FindingLine action = line(FindingSpot.Part.NOWHERE, "Action");
    FindingLine nut = line(FindingSpot.Part.NUT, "Nut slot high", 2);
    FindingLine string = line(FindingSpot.Part.STRING, "False string", 6);
    assertThat(picture(record, 1, fret, action, nut, string).findings())
        .containsExactly(
            new FindingMark(1, FindingMark.ALL_STRINGS, 7, "Fret 7"),
            new FindingMark(3, 1, 0, "Nut slot high"),
            new FindingMark(4, 5, FindingMark.ON_STRING, "False string"));
  }

  private static FindingLine line(FindingSpot.Part part, String head, Integer... strings) {
    return new FindingLine(List.of(strings), new FindingSpot(part, 0), head, "", "", "", "");
  }

  private static Neck neck(int strings) {
    return new Neck(strings, 648, 648, 22, null, false);
  }

  private static Saddle screws() {
    return new Saddle(SaddleKind.SCREW, 0.5, ScrewSense.NOT_KNOWN, null);
  }
}
