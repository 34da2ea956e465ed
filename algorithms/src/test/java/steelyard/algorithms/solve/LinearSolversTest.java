package steelyard.algorithms.solve;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Set;
import org.junit.jupiter.api.Test;
import steelyard.algorithms.Candidate;
import steelyard.algorithms.Scope;

class LinearSolversTest {

  @Test
  void theTextbookCandidateComesFirstAndEveryIdOnce() {
    assertThat(LinearSolvers.all())
        .extracting(Candidate::id)
        .containsExactly(
            "gauss-partial",
            "gauss-none",
            "gauss-rook",
            "gauss-complete",
            "gauss-jordan",
            "cramer",
            "inverse",
            "qr-householder",
            "qr-mgs",
            "qr-cgs",
            "cholesky",
            "gauss-refined",
            "gauss-refined-extended",
            "gauss-equilibrated",
            "commons-math-lu",
            "commons-math-qr",
            "commons-math-svd",
            "ejml-lu",
            "ejml-qr")
        .doesNotHaveDuplicates();
  }

  @Test
  void everyCandidateIsDescribedOnOneLineThatFitsATable() {
    assertThat(LinearSolvers.all())
        .allSatisfy(
            candidate ->
                assertThat(
                        new String[] {
                          candidate.description(), candidate.cost(), candidate.source()
                        })
                    .allSatisfy(text -> assertThat(text).isNotBlank().doesNotContain("|", "\n")));
  }

  @Test
  void onlyPublishedConstantsAreClaimed() {
    assertThat(LinearSolvers.all())
        .filteredOn(candidate -> candidate.bound().isPresent())
        .extracting(Candidate::id)
        .containsExactly("gauss-partial", "gauss-rook", "gauss-complete", "cholesky");
  }

  @Test
  void onlyCholeskyAndCramerAreForSomeProblemsOnly() {
    assertThat(LinearSolvers.all())
        .filteredOn(candidate -> !candidate.scope().equals(Scope.EVERYTHING))
        .extracting(Candidate::id)
        .containsExactly("cramer", "cholesky");
    Scope cholesky = Catalogue.candidate("cholesky").scope();
    assertThat(cholesky.covers(Set.of("positive-definite"), 1000)).isTrue();
    assertThat(cholesky.covers(Set.of(), 2)).isFalse();
    assertThat(Catalogue.candidate("cramer").scope().covers(Set.of(), 11)).isFalse();
  }
}
