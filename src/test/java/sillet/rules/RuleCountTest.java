package sillet.rules;

import static org.assertj.core.api.Assertions.assertThat;

import java.lang.reflect.Method;
import java.util.Arrays;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;

/** A rule that quietly stops being run looks just like a rule that holds. */
class RuleCountTest {
  private static final int RULES = 21;

  @Test
  void everyRuleIsATestThatRuns() {
    Stream<Method> rules =
        Stream.of(LayersTest.class, LibrariesTest.class, CodeTest.class)
            .flatMap(type -> Arrays.stream(type.getDeclaredMethods()))
            .filter(method -> method.isAnnotationPresent(Test.class));

    assertThat(rules).hasSize(RULES);
  }

  @Test
  void theRulesSeeTheProgramAndNotItsTests() {
    assertThat(Sillet.classes().contain("sillet.Main")).isTrue();
    assertThat(Sillet.classes().contain(RuleCountTest.class)).isFalse();
  }
}
