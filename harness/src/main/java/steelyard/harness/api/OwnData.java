package steelyard.harness.api;

import java.util.List;
import steelyard.harness.input.DataFiles;
import steelyard.harness.input.OwnFamily;
import steelyard.harness.task.Task;
import steelyard.problems.Data;
import steelyard.problems.Family;

/** The one problem that a caller brings along, wherever its numbers are. */
interface OwnData {

  /** Returns the family of that problem, for a task with all its candidates. */
  <D extends Data> Family<D> family(Task<?, D> task);

  /**
   * Numbers in files.
   *
   * @param source the files
   */
  record InFiles(DataFiles source) implements OwnData {
    @Override
    public <D extends Data> Family<D> family(Task<?, D> task) {
      return OwnFamily.read(task, source);
    }
  }

  /**
   * Numbers in arrays.
   *
   * @param parts the arrays
   */
  record InArrays(List<Data.Part> parts) implements OwnData {
    @Override
    public <D extends Data> Family<D> family(Task<?, D> task) {
      return new GivenData<>(task.problem(task.data(parts)));
    }
  }
}
