package sillet.store.reading;

import java.util.List;
import java.util.Optional;
import java.util.UUID;
import org.jdbi.v3.core.Handle;
import sillet.logbook.shop.Customer;
import sillet.logbook.shop.Shop;
import sillet.logbook.units.LengthUnit;
import sillet.store.columns.Row;
import sillet.store.engine.Session;

/** Questions about the shop and its customers. */
public final class ShopQueries {
  private static final String CUSTOMERS =
      "SELECT " + Records.CUSTOMER + ", c.version FROM customer c ";

  private final Session session;

  /**
   * Asks a session.
   *
   * @param session open, its columns taught
   */
  public ShopQueries(Session session) {
    this.session = session;
  }

  /**
   * The shop.
   *
   * @return its settings; nothing in a logbook that was never begun
   */
  public Optional<Kept<Shop>> shop() {
    return session.read(
        handle -> {
          List<String> technicians =
              handle
                  .createQuery("SELECT name FROM shop_technician ORDER BY item")
                  .mapTo(String.class)
                  .list();
          return handle
              .createQuery("SELECT * FROM shop")
              .map(Row.map(row -> shop(row, technicians)))
              .findOne();
        });
  }

  private static Kept<Shop> shop(Row row, List<String> technicians) throws java.sql.SQLException {
    Shop shop =
        new Shop(
            row.text("name"),
            row.kind("length_unit", LengthUnit.class),
            row.number("reference_hz"),
            row.number("breaking_share_percent"),
            technicians,
            row.truth("demo"));
    return new Kept<>(shop, row.integer("version"));
  }

  /**
   * Looks for customers by name, telephone number and address.
   *
   * @param typed words, each of which has to be found; blank for all
   * @return those who came last first
   */
  public Found<Kept<Customer>> customers(String typed) {
    SearchClause clause = SearchClause.of(typed, List.of("c.search_key"), "");
    return session.read(handle -> new Found<>(newest(handle, clause), count(handle, clause)));
  }

  private static List<Kept<Customer>> newest(Handle handle, SearchClause clause) {
    return handle
        .createQuery(
            CUSTOMERS + "WHERE " + clause.sql() + " ORDER BY c.last_action DESC, c.id LIMIT :most")
        .bindMap(clause.values())
        .bind("most", Found.MOST)
        .map(Row.map(ShopQueries::kept))
        .list();
  }

  private static int count(Handle handle, SearchClause clause) {
    return handle
        .createQuery("SELECT COUNT(*) FROM customer c WHERE " + clause.sql())
        .bindMap(clause.values())
        .mapTo(Integer.class)
        .one();
  }

  /**
   * One customer.
   *
   * @param id identity
   * @return the person, or nothing
   */
  public Optional<Kept<Customer>> customer(UUID id) {
    return session.read(
        handle ->
            handle
                .createQuery(CUSTOMERS + "WHERE c.id = :id")
                .bind("id", id)
                .map(Row.map(ShopQueries::kept))
                .findOne());
  }

  private static Kept<Customer> kept(Row row) throws java.sql.SQLException {
    return new Kept<>(Records.customer(row), row.integer("version"));
  }
}
