package steelyard.harness.plan;

import steelyard.harness.input.DataFiles;
import steelyard.harness.input.Inexact;

/**
 * The files of one problem that stand beside families in a plan.
 *
 * @param source the files, by absolute paths, and the columns
 * @param size n, as the files had it when the plan was read
 * @param inexact how many of their values were rounded
 */
public record OwnFiles(DataFiles source, int size, Inexact inexact) {}
