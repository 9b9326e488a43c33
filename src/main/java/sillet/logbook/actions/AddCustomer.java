package sillet.logbook.actions;

import sillet.logbook.shop.Customer;

/**
 * Enters a person.
 *
 * @param customer the person
 */
public record AddCustomer(Customer customer) implements Action {

  @Override
  public String name() {
    return "add customer";
  }
}
