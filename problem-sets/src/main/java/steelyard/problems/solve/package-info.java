/**
 * The problems of solving a square system of linear equations: the input, its judging, and the
 * families that generate it. How a reference is certified lives in the package {@code certificate};
 * no candidate lives here.
 */
package steelyard.problems.solve;
