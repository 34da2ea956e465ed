package steelyard.harness.benchmark;

import java.util.Map;
import java.util.function.Function;
import java.util.function.Supplier;

/**
 * The kernels by name. A name is a word and its arguments, divided by slashes: {@code
 * sum-exact/wide/100000}.
 */
final class Kernels {
  private static final Map<String, Function<String[], Supplier<?>>> ALL =
      Map.ofEntries(
          Map.entry("sum-naive", Sums::naive),
          Map.entry("sum-exact", Sums::exact),
          Map.entry("sum-bigdecimal", Sums::bigDecimal),
          Map.entry("dot-naive", Dots::naive),
          Map.entry("dot-exact", Dots::exact),
          Map.entry("dot-bigdecimal", Dots::bigDecimal),
          Map.entry("solve-lu", Solves::factorized),
          Map.entry("solve-certified", Solves::certified),
          Map.entry("solve-rational", Solves::rational),
          Map.entry("solve-bigdecimal", Solves::bigDecimal),
          Map.entry("make-reflected", Generators::reflected),
          Map.entry("make-dot", Generators::dot),
          Map.entry("make-dot-bigdecimal", Generators::dotByBigDecimal),
          Map.entry("phase", Phases::whole),
          Map.entry("phase-parts", Phases::parts));

  private Kernels() {}

  /** Makes a kernel's input and returns its work. */
  static Supplier<?> prepare(String name) {
    String[] words = name.split("/");
    return ALL.get(words[0]).apply(words);
  }
}
