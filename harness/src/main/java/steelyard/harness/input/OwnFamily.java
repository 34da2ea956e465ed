package steelyard.harness.input;

import java.util.List;
import org.apache.commons.rng.UniformRandomProvider;
import steelyard.harness.task.Task;
import steelyard.problems.Data;
import steelyard.problems.Family;
import steelyard.problems.Problem;
import steelyard.problems.Reach;

/**
 * The family whose one problem is a user's own data. So what is weighed on families can be weighed
 * on files as well.
 *
 * @param <D> the kind of input
 */
public final class OwnFamily<D extends Data> implements Family<D> {

  private static final int MEBIBYTE_BITS = 20;

  private final Task<?, D> task;
  private final DataFiles source;
  private final D data;
  private final Inexact inexact;
  private final int size;
  private Problem<D> problem;

  private OwnFamily(Task<?, D> task, DataFiles source, List<Data.Part> parts, Inexact inexact) {
    this.task = task;
    this.source = source;
    this.inexact = inexact;
    this.size = size(parts.get(0));
    try {
      this.data = task.data(parts);
    } catch (IllegalArgumentException unfit) {
      throw new InputException(source.words() + ": " + unfit.getMessage(), unfit);
    }
  }

  /**
   * Reads the files of a problem.
   *
   * @throws InputException if something is wrong with them
   */
  public static <D extends Data> OwnFamily<D> read(Task<?, D> task, DataFiles source) {
    PartsReader reader = new PartsReader(task, source);
    try {
      List<Data.Part> parts = reader.read();
      return new OwnFamily<>(task, source, parts, reader.inexact());
    } catch (OutOfMemoryError tooLarge) {
      throw tooLarge(source, tooLarge);
    }
  }

  /** Returns how many values of the files were rounded. */
  public Inexact inexact() {
    return inexact;
  }

  /** Returns n. */
  public int size() {
    return size;
  }

  /**
   * Returns the problem; its reference is computed the first time.
   *
   * @throws InputException if the arrays do not fit together
   * @throws steelyard.problems.UncertifiedException if no reference could be certified
   */
  public synchronized Problem<D> problem() {
    if (problem == null) {
      try {
        problem = task.problem(data);
      } catch (IllegalArgumentException unfit) {
        throw new InputException(source.words() + ": " + unfit.getMessage(), unfit);
      } catch (OutOfMemoryError tooLarge) {
        throw tooLarge(source, tooLarge);
      }
    }
    return problem;
  }

  /** An array that did not fit leaves the memory as it was, so that this can still be said. */
  private static InputException tooLarge(DataFiles source, OutOfMemoryError cause) {
    return new InputException(
        source.words()
            + " does not fit in the "
            + (Runtime.getRuntime().maxMemory() >> MEBIBYTE_BITS)
            + " MiB that this JVM may use; allow more, such as by JAVA_TOOL_OPTIONS=-Xmx2g",
        cause);
  }

  @Override
  public Profile profile() {
    return new Profile(source.familyId(), "your own data: " + source.words(), "none", "your file");
  }

  @Override
  public Reach reach() {
    return Reach.uncontrolled(size, size);
  }

  @Override
  public Problem<D> generate(Request request, UniformRandomProvider random) {
    requireReachable(request);
    return problem();
  }

  private static int size(Data.Part part) {
    return part instanceof Data.Matrix matrix
        ? matrix.rows().length
        : ((Data.Vector) part).values().length;
  }
}
