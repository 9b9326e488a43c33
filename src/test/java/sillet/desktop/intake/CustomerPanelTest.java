package sillet.desktop.intake;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.UUID;
import java.util.concurrent.TimeoutException;
import javafx.scene.control.TextField;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import sillet.desktop.drawing.Picture;
import sillet.desktop.visit.AtOnce;
import sillet.desktop.visit.TestDesk;
import sillet.logbook.shop.Customer;
import sillet.store.Logbook;

class CustomerPanelTest {
  private final CustomerModel model = new CustomerModel(UUID::randomUUID);

  @BeforeAll
  static void startToolkit() throws TimeoutException {
    Picture.startToolkit();
  }

  /** The person is on the disk although taking in failed; the name was typed with a space. */
  @Test
  void showsThatAPersonIsKnownWhoWasSavedOnThisPage() {
    boolean editable =
        Picture.onFxThread(
            () -> {
              try (Logbook logbook = Logbook.inMemory()) {
                CustomerPanel panel =
                    new CustomerPanel(
                        model, new TestDesk(logbook, new AtOnce()).desk(), chosen -> {});
                ((TextField) panel.lookup("#customer-name")).setText("Maren Oduya ");
                Customer saved =
                    new Customer(model.customer().id(), "Maren Oduya", "555 0144", "", "");
                model.choose(saved);
                panel.show();
                return ((TextField) panel.lookup("#customer-phone")).isEditable();
              }
            });
    assertThat(model.known()).map(Customer::name).contains("Maren Oduya");
    assertThat(editable).as("a known person is only looked at").isFalse();
  }
}
