package sillet.desktop.start;

import java.nio.file.Path;
import sillet.logbook.shop.Shop;

/** Where one can go while no logbook is open. */
public interface Ways {
  /** Makes the shop's logbook at its place. */
  void begin(Shop shop);

  /** Opens the invented shop, which has a logbook of its own. */
  void demo();

  /** Opens a logbook that lies elsewhere. */
  void open(Path file);

  /** Opens the shop's own logbook, once more. */
  void again();
}
