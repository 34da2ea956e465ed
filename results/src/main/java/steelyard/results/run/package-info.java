/**
 * The folder that a run writes: its files, where they come from, and how they appear complete or
 * not at all. The form of a table and the meaning of a row have no place here.
 */
package steelyard.results.run;
