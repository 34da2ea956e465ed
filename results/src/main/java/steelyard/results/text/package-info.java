/**
 * Plain text for a terminal: aligned tables and the summary of a run. Nothing is computed here that
 * a table does not already hold.
 */
package steelyard.results.text;
