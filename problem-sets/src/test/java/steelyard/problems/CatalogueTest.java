package steelyard.problems;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.nio.ByteBuffer;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import java.util.zip.CRC32;
import org.junit.jupiter.api.Test;
import steelyard.problems.dot.DotFamilies;
import steelyard.problems.sum.SumFamilies;

/** What holds for every family of the scalar tasks. */
class CatalogueTest {

  private static List<ProblemId> someIds() {
    List<ProblemId> ids = new ArrayList<>();
    SumFamilies.all().forEach(family -> ids.add(someId("sum", family)));
    DotFamilies.all().forEach(family -> ids.add(someId("dot", family)));
    return ids;
  }

  private static ProblemId someId(String task, Family<?> family) {
    OptionalDouble condition =
        family.reach().controlled() ? OptionalDouble.of(1e10) : OptionalDouble.empty();
    return new ProblemId(task, family.profile().id(), condition, 77, 2, 1);
  }

  private static Family<?> family(ProblemId id) {
    List<? extends Family<?>> families =
        id.task().equals("sum") ? SumFamilies.all() : DotFamilies.all();
    return families.stream()
        .filter(family -> family.profile().id().equals(id.family()))
        .findFirst()
        .orElseThrow();
  }

  private static String digest(ProblemId id) {
    CRC32 digest = new CRC32();
    for (Data.Part part : family(id).generate(id.request(), id.randomness()).data().parts()) {
      for (double value : ((Data.Vector) part).values()) {
        digest.update(ByteBuffer.allocate(8).putLong(Double.doubleToRawLongBits(value)).array());
      }
    }
    return id + " " + Long.toHexString(digest.getValue());
  }

  @Test
  void problemIsMadeAgainFromItsId() {
    for (ProblemId id : someIds()) {
      assertThat(digest(ProblemId.parse(id.toString()))).isEqualTo(digest(id));
    }
  }

  /**
   * The bits of one problem of each family. A change of a generator changes what every stored run
   * and baseline refers to, so it must be meant.
   */
  @Test
  void generatorsAreUnchanged() {
    assertThat(someIds().stream().map(CatalogueTest::digest))
        .containsExactly(
            "sum/same-sign/n77/r2 7d0f3ee",
            "sum/random-signs/n77/r2 ef094bbc",
            "sum/cancelling/k1e10/n77/r2 17ac916b",
            "sum/exp-series/k1e10/n77/r2 9c0ce20d",
            "sum/late-dominant/k1e10/n77/r2 7bfc5eeb",
            "sum/wide-exponent/n77/r2 f38a2dd9",
            "sum/overflow/n77/r2 ab5ee5b1",
            "sum/subnormal/n77/r2 96a91045",
            "sum/depot-ledger/n77/r2 f84c3039",
            "dot/same-sign/n77/r2 c054aac1",
            "dot/random-signs/n77/r2 f41ace93",
            "dot/cancelling/k1e10/n77/r2 607622dd",
            "dot/wide-exponent/n77/r2 5c17b34c",
            "dot/near-overflow/n77/r2 c55a08b6",
            "dot/near-underflow/n77/r2 e12d9b16");
  }

  @Test
  void requestsOutsideTheReachAreRefusedInOneSentence() {
    for (ProblemId id : someIds()) {
      Family<?> family = family(id);
      Reach reach = family.reach();
      assertRefused(family, new Family.Request(1, reach.minSize() - 1), "makes sizes from");
      assertRefused(family, new Family.Request(1, reach.maxSize() + 1), "makes sizes from");
      assertRefused(
          family, new Family.Request(reach.maxCondition() * 2, 77), "makes condition numbers");
      assertRefused(family, new Family.Request(Double.NaN, 77), "makes condition numbers");
    }
  }

  private static void assertRefused(Family<?> family, Family.Request request, String words) {
    ProblemId id = new ProblemId("any", "any", OptionalDouble.empty(), 1, 0, 1);
    assertThatThrownBy(() -> family.generate(request, id.randomness()))
        .isInstanceOf(UnreachableException.class)
        .hasMessageContaining(words)
        .hasMessageContaining(family.profile().id());
  }

  @Test
  void smallestSizesAreMade() {
    for (ProblemId id : someIds()) {
      Family<?> family = family(id);
      int size = family.reach().minSize();
      Problem<?> problem = family.generate(new Family.Request(1, size), id.randomness());
      assertThat(problem.size()).isEqualTo(size);
      assertThat(problem.reference().relativeBound()).isZero();
    }
  }
}
