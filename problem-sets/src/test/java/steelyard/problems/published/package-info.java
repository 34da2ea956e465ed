/**
 * Everything that was published of sums, dot products and linear systems and can be held against
 * this module: one table of values with their sources, and for every kind of row the computation
 * that must give its value. No value may stand in code.
 */
package steelyard.problems.published;
