package sillet.store.saving;

import java.util.List;
import org.jdbi.v3.core.statement.PreparedBatch;
import sillet.logbook.shop.Customer;
import sillet.logbook.shop.Shop;
import sillet.store.columns.SearchText;

/** What actions do to the shop and its customers. */
final class ShopEffects {
  private static final String UPDATE_SHOP =
      """
      UPDATE shop SET version = version + 1, name = :name, length_unit = :lengthUnit,
        reference_hz = :referenceHz, breaking_share_percent = :breakingSharePercent, demo = :demo
      WHERE id = 1
      """;
  private static final String INSERT_SHOP =
      """
      INSERT INTO shop
        (id, version, name, length_unit, reference_hz, breaking_share_percent, demo)
      VALUES (1, 1, :name, :lengthUnit, :referenceHz, :breakingSharePercent, :demo)
      """;
  private static final String INSERT_CUSTOMER =
      """
      INSERT INTO customer (id, version, name, phone, email, note, search_key, last_action)
      VALUES (:id, 1, :name, :phone, :email, :note, :searchKey, :sequence)
      """;
  private static final String UPDATE_CUSTOMER =
      """
      UPDATE customer SET version = version + 1, name = :name, phone = :phone, email = :email,
        note = :note, search_key = :searchKey, last_action = :sequence
      WHERE id = :id AND version = :version
      """;

  private ShopEffects() {}

  static void name(Change change, Shop shop) {
    int rows = change.handle().createUpdate(UPDATE_SHOP).bindMethods(shop).execute();
    if (rows == 0) {
      change.handle().createUpdate(INSERT_SHOP).bindMethods(shop).execute();
    }
    change.handle().execute("DELETE FROM shop_technician");
    technicians(change, shop.technicians());
  }

  private static void technicians(Change change, List<String> names) {
    PreparedBatch batch =
        change
            .handle()
            .prepareBatch("INSERT INTO shop_technician (shop_id, item, name) VALUES (1, ?, ?)");
    for (int item = 0; item < names.size(); item++) {
      batch.add(item, names.get(item));
    }
    batch.execute();
  }

  static void add(Change change, Customer customer) {
    change
        .handle()
        .createUpdate(INSERT_CUSTOMER)
        .bindMethods(customer)
        .bind("searchKey", searchKey(customer))
        .bind("sequence", change.sequence())
        .execute();
  }

  static void revise(Change change, Customer customer, int version) {
    int rows =
        change
            .handle()
            .createUpdate(UPDATE_CUSTOMER)
            .bindMethods(customer)
            .bind("searchKey", searchKey(customer))
            .bind("sequence", change.sequence())
            .bind("version", version)
            .execute();
    change.mustBeOne(rows, "customer", customer.id());
  }

  private static String searchKey(Customer customer) {
    return SearchText.fold(
        customer.name(), customer.phone(), SearchText.digits(customer.phone()), customer.email());
  }
}
