package steelyard.results.text;

import java.util.List;
import steelyard.results.Tradeoff;

/** On how many families of a task, at its largest size, a candidate is on the frontier. */
final class FrontierCount {
  private final List<Tradeoff> marked;

  private FrontierCount(List<Tradeoff> marked) {
    this.marked = marked;
  }

  static FrontierCount of(String task, List<Tradeoff> tradeoffs) {
    List<Tradeoff> marked =
        tradeoffs.stream()
            .filter(t -> t.task().equals(task) && t.onFrontier().isPresent())
            .toList();
    int largest = marked.stream().mapToInt(Tradeoff::size).max().orElse(0);
    return new FrontierCount(marked.stream().filter(t -> t.size() == largest).toList());
  }

  /** Returns a text such as {@code 2/3}: on two of the three families that have a time. */
  String text(String candidate) {
    List<Tradeoff> own = marked.stream().filter(t -> t.candidate().equals(candidate)).toList();
    long on = own.stream().filter(t -> t.onFrontier().orElse(false)).count();
    return own.isEmpty() ? Figures.NONE : on + "/" + own.size();
  }
}
