/**
 * Certified solutions and condition numbers of linear systems: one argument about an approximate
 * inverse, and the arithmetics that can supply one. Nothing here generates a system or judges an
 * answer.
 */
package steelyard.problems.solve.certificate;
