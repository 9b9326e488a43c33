package sillet.logbook.actions;

import sillet.logbook.shop.Shop;

/**
 * Sets what the shop is called and how it works.
 *
 * @param shop the settings, whole
 */
public record NameShop(Shop shop) implements Action {

  @Override
  public String name() {
    return "name shop";
  }
}
