package steelyard.harness.timing;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.nio.file.Path;
import java.time.Duration;
import java.util.Arrays;
import java.util.List;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import steelyard.harness.data.DataFile;
import steelyard.harness.plan.TimingEffort;
import steelyard.problems.Data;

/** Real forks, as short as they can be: that a figure arrives, not how large it is. */
final class JmhStopwatchTest {

  private static final TimingEffort SHORTEST = new TimingEffort(1, 0, 3, 10, List.of());

  @TempDir private Path directory;
  private Path input;

  @BeforeEach
  void storeAnInput() throws Exception {
    double[] terms = new double[64];
    Arrays.setAll(terms, i -> 1.0 / (i + 1));
    input = directory.resolve("terms.bin");
    DataFile.write(input, List.of(new Data.Vector("terms", terms)));
  }

  @Test
  void aFigureComesWithItsIntervalAndAllocation() throws TimingException {
    Score lean =
        new JmhStopwatch(Duration.ZERO, List.of()).measure("sum", "recursive", input, SHORTEST);
    assertThat(lean.ns()).isPositive();
    assertThat(lean.lowNs()).isBetween(0.0, lean.ns());
    assertThat(lean.highNs()).isGreaterThanOrEqualTo(lean.ns());

    Score wasteful =
        new JmhStopwatch(Duration.ZERO, List.of()).measure("sum", "big-decimal", input, SHORTEST);
    assertThat(wasteful.allocatedBytes().orElseThrow()).isGreaterThan(1000);
  }

  @Test
  void aForkThatFailsIsOneSentence() {
    Path missing = directory.resolve("missing.bin");
    assertThatThrownBy(
            () ->
                new JmhStopwatch(Duration.ZERO, List.of())
                    .measure("sum", "recursive", missing, SHORTEST))
        .isInstanceOf(TimingException.class)
        .hasMessageStartingWith("the timed program failed");
  }
}
