package sillet.logbook.demo;

import static org.assertj.core.api.Assertions.assertThat;

import java.time.LocalDate;
import java.util.List;
import org.junit.jupiter.api.Test;
import sillet.logbook.actions.AddCustomer;
import sillet.logbook.actions.AddInstrument;
import sillet.logbook.actions.KeepStringSet;
import sillet.logbook.actions.NameShop;

class DemoShopTest {
  private static final LocalDate TODAY = LocalDate.of(2026, 1, 15);

  @Test
  void marksEveryNameAsDemo() {
    List<String> names = DemoShop.story(TODAY).stream().flatMap(d -> names(d).stream()).toList();
    assertThat(names).hasSizeGreaterThan(9).allMatch(name -> name.contains("(demo)"));
  }

  @Test
  void tellsTheSameStoryTwice() {
    assertThat(DemoShop.story(TODAY)).isEqualTo(DemoShop.story(TODAY));
  }

  private static List<String> names(DemoAction told) {
    if (told.action() instanceof AddCustomer add) {
      return List.of(add.customer().name(), told.technician());
    } else if (told.action() instanceof AddInstrument add) {
      return List.of(add.instrument().name());
    } else if (told.action() instanceof KeepStringSet keep) {
      return List.of(keep.set().name());
    } else if (told.action() instanceof NameShop name) {
      return List.of(name.shop().name());
    }
    return List.of(told.technician());
  }
}
