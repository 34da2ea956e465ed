/**
 * The accuracy phase: every candidate on every problem, each failure kept to its own row. It judges
 * nothing itself, takes no times, and writes no files.
 */
package steelyard.harness.run;
