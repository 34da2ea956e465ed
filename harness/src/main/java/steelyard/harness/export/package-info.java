/**
 * Problems as files that other tools read: Matrix Market, CSV and JSON, in a folder for each
 * problem. Nothing here makes or judges a problem, and no table of a run is written here.
 */
package steelyard.harness.export;
