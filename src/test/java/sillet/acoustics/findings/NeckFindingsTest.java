package sillet.acoustics.findings;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.OptionalInt;
import java.util.Set;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import sillet.acoustics.estimate.InstrumentEvidence;
import sillet.acoustics.estimate.NeckEstimate;
import sillet.acoustics.estimate.NeckEstimator;
import sillet.acoustics.estimate.StringHistory;
import sillet.acoustics.findings.Evidence.Measure;
import sillet.acoustics.findings.FindingOptions.Note;
import sillet.acoustics.readings.FretReading;
import sillet.acoustics.virtual.Fault;
import sillet.acoustics.virtual.VirtualInstrument;

/** On virtual electric guitars, which are not the model; the whole table is the bench's. */
class NeckFindingsTest {
  private static final VirtualInstrument SOUND =
      Readout.build(sillet.acoustics.virtual.Kind.ELECTRIC, 7);

  @ParameterizedTest
  @ValueSource(longs = {1, 2, 3, 4, 5})
  void aSoundInstrumentGetsNone(long seed) {
    assertThat(findings(SOUND, seed)).isEmpty();
  }

  @Test
  void namesTheStringWhoseSlotIsHigh() {
    NeckFinding finding = only(findings(SOUND.with(new Fault.HighSlot(4, 4.5e-4)), 1));
    assertThat(finding.kind()).isEqualTo(Kind.NUT_HIGH);
    assertThat(finding.string()).hasValue(4);
    assertThat(finding.amount()).isCloseTo(4.3e-4, within(1e-4));
    assertThat(finding.worthCents()).isPositive();
    assertThat(finding.evidence(Measure.CENTS).orElseThrow()).isGreaterThan(1);
    assertThat(finding.evidence(Measure.GAP).orElseThrow())
        .isGreaterThan(finding.evidence(Measure.GAP_OF_NEIGHBOURS).orElseThrow() + 2e-4);
  }

  /** A nut 0.5 mm too far makes every note 1.3 cents sharp on a scale of 648 mm [D]. */
  @ParameterizedTest
  @ValueSource(doubles = {1.2e-3, -1.2e-3})
  void tellsANutTooFarFromOneTooNear(double far) {
    NeckFinding finding = only(findings(SOUND.with(new Fault.NutPlace(far)), 2));
    assertThat(finding.kind()).isEqualTo(far > 0 ? Kind.NUT_FAR : Kind.NUT_NEAR);
    assertThat(finding.string()).isEmpty();
    assertThat(finding.amount()).isCloseTo(Math.abs(far), within(5e-4));
    double perMetre = 1.3 / 5e-4 * 0.648 / SOUND.neck().scale();
    double cents = finding.evidence(Measure.CENTS).orElseThrow();
    assertThat(Math.abs(cents) / finding.amount()).isCloseTo(perMetre, within(0.05 * perMetre));
    assertThat(Math.signum(cents)).isEqualTo(Math.signum(far));
  }

  /** Cents per 0.1 mm of a fret on 648 mm: fret 5 0.36 [D]. */
  @Test
  void namesAFretThatIsOffUnderAllStrings() {
    NeckFinding finding = only(findings(SOUND.with(new Fault.FretPlace(5, 5e-4, 5e-4)), 3));
    assertThat(finding.kind()).isEqualTo(Kind.FRET);
    assertThat(finding.fret()).hasValue(5);
    assertThat(finding.slanted()).isFalse();
    assertThat(finding.amount()).isCloseTo(5e-4, within(1.6e-4));
    double perTenth = finding.evidence(Measure.CENTS).orElseThrow() / finding.amount() * 1e-4;
    assertThat(perTenth * SOUND.neck().scale() / 0.648).isCloseTo(0.36, within(0.01));
    assertThat(finding.evidence(Measure.STRINGS_READ)).hasValue(6);
    assertThat(finding.evidence(Measure.STRINGS_AGREEING).orElseThrow()).isGreaterThan(4);
  }

  @Test
  void seesThatAFretIsSlanted() {
    NeckFinding finding = only(findings(SOUND.with(new Fault.FretPlace(9, 5e-4, -5e-4)), 4));
    assertThat(finding.fret()).hasValue(9);
    assertThat(finding.slanted()).isTrue();
    assertThat(finding.evidence(Measure.PLACE_AT_FIRST).orElseThrow()).isPositive();
    assertThat(finding.evidence(Measure.PLACE_AT_LAST).orElseThrow()).isNegative();
  }

  @Test
  void suspectsAStringThatErrsWithoutATrend() {
    Fault uneven = new Fault.UnevenString(2, 0.015, 0.3, 1);
    NeckFinding finding = only(findings(SOUND.with(uneven), 5));
    assertThat(finding.kind()).isEqualTo(Kind.STRING);
    assertThat(finding.string()).hasValue(2);
    assertThat(finding.evidence(Measure.MASS_SWING).orElseThrow()).isBetween(0.008, 0.03);
  }

  @Test
  void namesAWildReading() {
    List<StringHistory> strings = new ArrayList<>(new Readout(SOUND, 6).histories(Readout.ALL));
    List<FretReading> readings = new ArrayList<>(strings.get(3).now().readings());
    readings.set(6, new FretReading(7, readings.get(6).cents() + 9, 0.4));
    strings.set(3, new Readout(SOUND, 6).history(SOUND.strings().get(3), readings));
    NeckEstimate estimate = NeckEstimator.estimate(new InstrumentEvidence(strings)).orElseThrow();
    NeckFinding finding = only(NeckFindings.of(estimate, FindingOptions.NONE));
    assertThat(finding.kind()).isEqualTo(Kind.READING);
    assertThat(finding.string()).hasValue(3);
    assertThat(finding.fret()).hasValue(7);
    assertThat(finding.amount()).isCloseTo(9, within(1.5));
  }

  @Test
  void findsSeveralFaultsAtOnceInTheOrderToLook() {
    VirtualInstrument faulty =
        SOUND
            .with(new Fault.HighSlot(1, 5e-4))
            .with(new Fault.FretPlace(10, 5.5e-4, 5.5e-4))
            .with(new Fault.NutPlace(1.3e-3));
    assertThat(findings(faulty, 7))
        .extracting(NeckFinding::kind)
        .containsExactly(Kind.NUT_HIGH, Kind.NUT_FAR, Kind.FRET);
  }

  @Test
  void saysNothingOfASingleReadingAtFretTwelve() {
    VirtualInstrument faulty = SOUND.with(new Fault.NutPlace(1.3e-3));
    NeckEstimate estimate = new Readout(faulty, 8).estimate(12);
    assertThat(NeckFindings.of(estimate, FindingOptions.NONE)).isEmpty();
    FindingOptions disagree = new FindingOptions(Map.of(), Set.of(new Note(2, 12)));
    NeckFinding finding = only(NeckFindings.of(estimate, disagree));
    assertThat(finding.kind()).isEqualTo(Kind.READING);
    assertThat(finding.string()).hasValue(2);
    assertThat(finding.fret()).isEqualTo(OptionalInt.of(12));
  }

  @Test
  void saysNothingWithoutAReading() {
    assertThat(NeckFindings.of(new Readout(SOUND, 1).estimate(), FindingOptions.NONE)).isEmpty();
  }

  @Test
  void blamesTheActionOnlyAgainstATarget() {
    NeckEstimate estimate = new Readout(SOUND, 9).estimate(Readout.ALL);
    double action = estimate.actionAtTwelve(5).value();
    FindingOptions low = new FindingOptions(Map.of(5, action - 1e-3), Set.of());
    NeckFinding finding = only(NeckFindings.of(estimate, low));
    assertThat(finding.kind()).isEqualTo(Kind.ACTION);
    assertThat(finding.string()).hasValue(5);
    assertThat(finding.amount()).isCloseTo(1e-3, within(1e-9));
    FindingOptions met = new FindingOptions(Map.of(5, action), Set.of());
    assertThat(NeckFindings.of(estimate, met)).isEmpty();
  }

  private static List<NeckFinding> findings(VirtualInstrument instrument, long seed) {
    NeckEstimate estimate = new Readout(instrument, seed).estimate(Readout.ALL);
    return NeckFindings.of(estimate, FindingOptions.NONE);
  }

  private static NeckFinding only(List<NeckFinding> findings) {
    assertThat(findings).hasSize(1);
    return findings.get(0);
  }
}
