package sillet.logbook.forecast;

import java.util.ArrayList;
import java.util.List;
import java.util.Objects;
import org.jspecify.annotations.Nullable;
import sillet.logbook.moves.AimChoice;
import sillet.logbook.moves.BenchHistory;
import sillet.logbook.moves.BenchString;
import sillet.logbook.moves.FindingReport;
import sillet.logbook.moves.InstrumentFindings;
import sillet.logbook.moves.KnownNeck;
import sillet.logbook.text.Message;
import sillet.logbook.visits.InstrumentPast;
import sillet.logbook.visits.VisitMoves;
import sillet.logbook.visits.VisitRecord;

/**
 * Tells what a change will ask of an instrument. What readings taught of it is used; without any it
 * answers from the packet, with wider intervals.
 */
public final class Forecaster {
  private final double breakingShare;

  /**
   * A forecaster with the shop's own limit.
   *
   * @param breakingSharePercent a string that would be tuned beyond this share of its breaking
   *     tension is flagged, percent
   */
  public Forecaster(double breakingSharePercent) {
    this.breakingShare = breakingSharePercent / 100;
  }

  /**
   * Forecasts a change from where an instrument stands at the last pass of a visit.
   *
   * @param record everything the logbook holds of the visit
   * @param past what came before
   * @param change what the instrument will be
   * @return what that will ask for
   * @throws sillet.logbook.text.Rejection if a changed string cannot be so, as with a core thicker
   *     than its gauge
   */
  public InstrumentForecast ofVisit(
      VisitRecord record, InstrumentPast past, InstrumentChange change) {
    return forecast(VisitMoves.histories(record, past), change, record.aim().aim());
  }

  /**
   * Forecasts a change of an instrument.
   *
   * @param strings all of the same instrument with everything read of them, string 1 first
   * @param change what it will be
   * @param aim what the saddles are to make true then
   * @return what that will ask for
   * @throws sillet.logbook.text.Rejection if a changed string cannot be so
   */
  public InstrumentForecast forecast(
      List<BenchHistory> strings, InstrumentChange change, AimChoice aim) {
    KnownNeck neck = KnownNeck.of(strings);
    List<FutureString> future = new Future(neck, change, aim).strings();
    List<FindingReport> findings = InstrumentFindings.of(neck);
    double meanN =
        future.stream()
            .map(FutureString::tensionThenN)
            .filter(Objects::nonNull)
            .mapToDouble(Double::doubleValue)
            .average()
            .orElse(0);
    List<StringForecast> forecasts = new ArrayList<>();
    for (int i = 0; i < strings.size(); i++) {
      forecasts.add(string(future.get(i), meanN, change));
    }
    double nowN = pull(forecasts, false);
    double thenN = pull(forecasts, true);
    WhatToRedo redo = new WhatToRedo(forecasts, change, nowN, thenN);
    return new InstrumentForecast(forecasts, nowN, thenN, findings, redo.list(), redo.cautions());
  }

  private StringForecast string(FutureString future, double meanN, InstrumentChange change) {
    BenchString now = future.now();
    StringTension tension = future.tension(meanN);
    StringOutlookWords words = new StringOutlookWords(future, tension, breakingShare);
    List<Message> notes = words.all(change);
    return new StringForecast(
        now, future.then(), tension, future.figures(), future.verdict(), future.neck(), notes);
  }

  private static double pull(List<StringForecast> strings, boolean then) {
    double sum = 0;
    for (StringForecast one : strings) {
      @Nullable StringTension tension = one.tension();
      if (tension != null) {
        sum += then ? tension.thenN() : tension.nowN();
      }
    }
    return sum;
  }
}
