/**
 * What the command line does, from Java. This package is the public interface of Steelyard,
 * together with the types that its signatures name: the interfaces of the tasks and {@code
 * Candidate} and {@code Bound} in {@code steelyard.algorithms}, {@code Problem} and its answers in
 * {@code steelyard.problems}, {@code Plan} and {@code Progress}, the rows in {@code
 * steelyard.results}, {@code Run} and the choice. Everything else is internal and may change.
 */
package steelyard.harness.api;
