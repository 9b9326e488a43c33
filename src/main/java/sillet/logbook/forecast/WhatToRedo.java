package sillet.logbook.forecast;

import java.util.ArrayList;
import java.util.List;
import java.util.function.Predicate;
import java.util.stream.Collectors;
import sillet.logbook.strings.ConstructionWords;
import sillet.logbook.strings.StringMake;
import sillet.logbook.text.Message;
import sillet.logbook.units.Figures;

/**
 * What must be done or read again after a change: gauge, brand, tuning or pitch ask for everything
 * from relief on, heights for what lies above them. Never how far to turn a rod.
 */
final class WhatToRedo {
  private static final double PERCENT = 100;

  /** A slot lets a string of the next gauge lie loose (common practice, no source), inches. */
  private static final double LOOSE_IN = 0.003;

  private final List<StringForecast> strings;
  private final InstrumentChange change;
  private final double nowN;
  private final double thenN;

  WhatToRedo(List<StringForecast> strings, InstrumentChange change, double nowN, double thenN) {
    this.strings = strings;
    this.change = change;
    this.nowN = nowN;
    this.thenN = thenN;
  }

  /** In the order it stands on the instrument. */
  List<Message> list() {
    List<Message> redo = new ArrayList<>();
    if (restrung() || retuned()) {
      redo.add(pull());
      redo.add(Message.of("redo.springs"));
      slots(redo);
      if (restrung()) {
        redo.add(Message.of("redo.settle"));
      }
      redo.add(Message.of("redo.heights"));
      redo.add(Message.of("redo.pickups"));
      redo.add(Message.of("redo.intonation"));
    } else if (raised()) {
      redo.add(Message.of("redo.action"));
      redo.add(Message.of("redo.pickups"));
      redo.add(Message.of("redo.intonation"));
    }
    return redo;
  }

  private Message pull() {
    double percent = nowN == 0 ? 0 : (thenN / nowN - 1) * PERCENT;
    String newtons = Figures.fixed(Math.abs(thenN - nowN), 0);
    String share = Figures.fixed(Math.abs(percent), 0);
    return thenN >= nowN
        ? Message.of("redo.relief-more", newtons, share)
        : Message.of("redo.relief-less", newtons, share);
  }

  private void slots(List<Message> redo) {
    String wider = numbers(one -> gaugeGrows(one) > 0);
    if (!wider.isEmpty()) {
      redo.add(Message.of("redo.slots-wider", wider));
    }
    String loose = numbers(one -> gaugeGrows(one) < -LOOSE_IN);
    if (!loose.isEmpty()) {
      redo.add(Message.of("redo.slots-loose", loose));
    }
    String other = numbers(WhatToRedo::plainForWound);
    if (!other.isEmpty()) {
      redo.add(Message.of("redo.plain-wound", other));
    }
  }

  /** Where the change can hurt. */
  List<Message> cautions() {
    List<Message> cautions = new ArrayList<>();
    if (restrung() || retuned() || raised()) {
      cautions.add(Message.of("finding.caution.tension"));
    }
    if (!numbers(one -> gaugeGrows(one) > 0).isEmpty()) {
      cautions.add(Message.of("finding.caution.nut"));
    }
    if (thenN > nowN && (restrung() || retuned())) {
      cautions.add(Message.of("redo.caution-pull"));
    }
    return cautions;
  }

  private boolean restrung() {
    return strings.stream().anyMatch(one -> !one.then().make().equals(one.now().string().make()));
  }

  private boolean retuned() {
    return strings.stream()
        .anyMatch(one -> one.then().pitch().hz() != one.now().string().pitch().hz());
  }

  private boolean raised() {
    return change.strings().stream().anyMatch(one -> one.action12Mm() != null);
  }

  private String numbers(Predicate<StringForecast> which) {
    return strings.stream()
        .filter(which)
        .map(one -> Integer.toString(one.then().number()))
        .collect(Collectors.joining(", "));
  }

  private static double gaugeGrows(StringForecast one) {
    return one.then().make().gaugeIn() - one.now().string().make().gaugeIn();
  }

  private static boolean plainForWound(StringForecast one) {
    StringMake now = one.now().string().make();
    return ConstructionWords.wound(now.construction())
        != ConstructionWords.wound(one.then().make().construction());
  }
}
