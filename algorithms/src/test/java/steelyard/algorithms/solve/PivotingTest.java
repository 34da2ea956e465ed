package steelyard.algorithms.solve;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;
import steelyard.algorithms.solve.Pivoting.Position;

class PivotingTest {

  private static final double[][] A = {{1, 0, -9}, {-5, 6, 0}, {0, 4, 0}};

  @Test
  void eachStrategyChoosesItsOwnPivot() {
    assertThat(Pivoting.NONE.choose(A, 0)).isEqualTo(new Position(0, 0));
    assertThat(Pivoting.PARTIAL.choose(A, 0)).isEqualTo(new Position(1, 0));
    assertThat(Pivoting.ROOK.choose(A, 0)).isEqualTo(new Position(1, 1));
    assertThat(Pivoting.COMPLETE.choose(A, 0)).isEqualTo(new Position(0, 2));
  }

  @Test
  void eliminatedRowsAndColumnsAreNotSearched() {
    assertThat(Pivoting.PARTIAL.choose(A, 1)).isEqualTo(new Position(1, 1));
    assertThat(Pivoting.ROOK.choose(A, 1)).isEqualTo(new Position(1, 1));
    assertThat(Pivoting.COMPLETE.choose(A, 1)).isEqualTo(new Position(1, 1));
    assertThat(Pivoting.COMPLETE.choose(A, 2)).isEqualTo(new Position(2, 2));
  }

  @Test
  void rookFollowsAChainOfEverLargerEntries() {
    double[][] chain = {{1, 2, 0, 0}, {0, 3, 4, 0}, {0, 0, 5, 6}, {9, 0, 0, 7}};
    // 9 is largest in its column and its row, although a chain could lead along the diagonal.
    assertThat(Pivoting.ROOK.choose(chain, 0)).isEqualTo(new Position(3, 0));
    chain[3][0] = 0;
    assertThat(Pivoting.ROOK.choose(chain, 0)).isEqualTo(new Position(3, 3));
  }

  @Test
  void equalEntriesStayWhereTheyAre() {
    double[][] ones = {{1, 1}, {1, 1}};
    for (Pivoting pivoting : Pivoting.values()) {
      assertThat(pivoting.choose(ones, 0)).isEqualTo(new Position(0, 0));
    }
  }
}
