package sillet.logbook.actions;

import sillet.logbook.shop.Customer;

/**
 * Changes what is known of a person.
 *
 * @param customer the person, whole
 * @param version the version of the row that was read before
 */
public record ReviseCustomer(Customer customer, int version) implements Action {

  @Override
  public String name() {
    return "revise customer";
  }
}
