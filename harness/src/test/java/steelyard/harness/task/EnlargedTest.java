package steelyard.harness.task;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.List;
import org.junit.jupiter.api.Test;
import steelyard.algorithms.Candidate;
import steelyard.algorithms.sum.Summation;
import steelyard.problems.sum.Terms;

class EnlargedTest {

  private static final Summation BACKWARDS =
      terms -> {
        double sum = 0;
        for (int i = terms.length - 1; i >= 0; i--) {
          sum += terms[i];
        }
        return sum;
      };

  @Test
  void keepsTheTextbookCandidateFirstAndAddsBehind() {
    Task<Summation, Terms> enlarged = new SumTask().with(List.of(candidate("backwards")));
    assertThat(enlarged.candidates().get(0).id()).isEqualTo("recursive");
    assertThat(enlarged.candidates().get(enlarged.candidates().size() - 1).id())
        .isEqualTo("backwards");
  }

  @Test
  void refusesASecondCandidateOfTheSameName() {
    assertThatThrownBy(() -> new SumTask().with(List.of(candidate("kahan"))))
        .hasMessage("task 'sum' has two candidates named 'kahan'");
  }

  private static Candidate<Summation> candidate(String id) {
    return Candidate.of(id, BACKWARDS, "from the last to the first", "n", "this test");
  }
}
