/**
 * What is to be weighed: plans, their reading from TOML with its one-sentence errors, and the
 * enumeration of a plan into problems and timings. Nothing here makes a problem, runs a candidate
 * or writes a file.
 */
package steelyard.harness.plan;
