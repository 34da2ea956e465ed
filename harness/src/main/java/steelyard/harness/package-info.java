/**
 * The weighing: it brings candidates and problems together, measures, and writes tables. Errors are
 * computed by problems, verdicts by results; neither happens here.
 */
package steelyard.harness;
