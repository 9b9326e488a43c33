package sillet.logbook.demo;

import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.UUID;
import sillet.logbook.shop.Customer;

/** Invented customers. */
final class DemoPeople {
  static final Customer PETRA =
      new Customer(
          id("customer petra"), "Petra Quandoor (demo)", "555 0119", "", "Plays with a capo at 2");
  static final Customer OSK =
      new Customer(id("customer osk"), "Osk Tavelin (demo)", "555 0127", "", "");
  static final Customer MIRREN =
      new Customer(id("customer mirren"), "Mirren Sploy (demo)", "555 0163", "", "Left-handed");

  private DemoPeople() {}

  static List<Customer> all() {
    return List.of(PETRA, OSK, MIRREN);
  }

  /** The same identity for the same thing each time the story is told. */
  static UUID id(String thing) {
    return UUID.nameUUIDFromBytes(("sillet demo " + thing).getBytes(StandardCharsets.UTF_8));
  }
}
