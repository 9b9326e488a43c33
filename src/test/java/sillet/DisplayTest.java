package sillet;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Map;
import org.junit.jupiter.api.Test;

class DisplayTest {
  @Test
  void needsAnXServerOnLinux() {
    assertThat(Display.isThere("Linux", false, Map.of())).isFalse();
    assertThat(Display.isThere("Linux", false, Map.of("DISPLAY", " "))).isFalse();
    assertThat(Display.isThere("Linux", false, Map.of("WAYLAND_DISPLAY", "wayland-0"))).isFalse();
    assertThat(Display.isThere("Linux", false, Map.of("DISPLAY", ":0"))).isTrue();
  }

  @Test
  void isThereOnSystemsThatDrawByThemselves() {
    assertThat(Display.isThere("Windows 11", false, Map.of())).isTrue();
    assertThat(Display.isThere("Mac OS X", false, Map.of())).isTrue();
  }

  @Test
  void isNotThereWhenJavaWasToldToDoWithout() {
    assertThat(Display.isThere("Linux", true, Map.of("DISPLAY", ":0"))).isFalse();
    assertThat(Display.isThere("Windows 11", true, Map.of())).isFalse();
  }
}
