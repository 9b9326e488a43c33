package sillet.desktop.controls;

import java.time.Clock;
import sillet.logbook.shop.Shop;

/** Who works in whose shop, and when. Ask at the moment of saving: the technician may change. */
public interface AtBench {
  /** The shop as last saved. */
  Shop shop();

  /** Who is at the bench now. */
  String technician();

  /** The clock of every save, with the shop's time zone. */
  Clock clock();
}
