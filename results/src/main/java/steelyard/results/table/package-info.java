/**
 * The CSV form of the rows: columns, schemas, reading, writing, and the printing of numbers. What
 * the figures mean for a candidate has no place here.
 */
package steelyard.results.table;
