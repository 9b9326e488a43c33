package sillet.logbook.demo;

import java.time.Instant;
import java.time.LocalDate;
import java.time.ZoneOffset;
import java.util.ArrayList;
import java.util.List;
import sillet.logbook.actions.AddCustomer;
import sillet.logbook.actions.AddInstrument;
import sillet.logbook.actions.KeepStringSet;
import sillet.logbook.actions.NameShop;
import sillet.logbook.shop.Shop;
import sillet.logbook.units.LengthUnit;
import sillet.logbook.units.Pitch;

/**
 * The demo shop: a few customers and instruments, one of them with a history, and one visit open on
 * the bench.
 */
public final class DemoShop {
  /** The ticket of the visit that is open and read once. */
  public static final int OPEN_TICKET = 1042;

  /** The ticket of the finished visit, with a second pass that proved it. */
  public static final int FINISHED_TICKET = 1007;

  /** The ticket of an instrument read along its whole neck. */
  public static final int NECK_TICKET = 1013;

  /** The ticket of the same instrument, back and open on the bench. */
  public static final int NECK_AGAIN_TICKET = 1044;

  /** The technician of the story. */
  public static final String TECHNICIAN = "Ilse (demo)";

  private static final List<String> TECHNICIANS = List.of(TECHNICIAN, "Bram (demo)");
  private static final int NINE_O_CLOCK = 9;

  private DemoShop() {}

  /**
   * Tells the story.
   *
   * @param today the day the open visit came in
   * @return the actions in order, complete from an empty logbook
   */
  public static List<DemoAction> story(LocalDate today) {
    LocalDate opened = today.minusYears(3);
    List<DemoAction> story = new ArrayList<>();
    Instant start = morning(opened);
    Shop shop =
        new Shop(
            "Tin Lantern Strings (demo)",
            LengthUnit.MM,
            Pitch.CONCERT_A4_HZ,
            Shop.USUAL_BREAKING_SHARE_PERCENT,
            TECHNICIANS,
            true);
    story.add(new DemoAction(start, TECHNICIAN, new NameShop(shop)));
    DemoPeople.all().forEach(c -> story.add(new DemoAction(start, TECHNICIAN, new AddCustomer(c))));
    DemoStrings.sets()
        .forEach(s -> story.add(new DemoAction(start, TECHNICIAN, new KeepStringSet(s))));
    DemoInstruments.all()
        .forEach(i -> story.add(new DemoAction(start, TECHNICIAN, new AddInstrument(i))));
    story.addAll(DemoVisits.finished(today.minusMonths(20)));
    story.addAll(DemoParts.lapwing(today.minusMonths(20)));
    story.addAll(DemoNeck.first(today.minusMonths(14)));
    story.addAll(DemoNeck.again(today.minusDays(1)));
    story.addAll(DemoVisits.open(today));
    story.addAll(DemoVisits.arrived(today));
    return List.copyOf(story);
  }

  static Instant morning(LocalDate day) {
    return day.atTime(NINE_O_CLOCK, 0).toInstant(ZoneOffset.UTC);
  }
}
