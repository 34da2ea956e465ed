/**
 * Systems of linear equations solved in rational numbers, without any rounding, and the arithmetic
 * modulo a prime that this takes. What is merely enclosed does not belong here.
 */
package steelyard.problems.solve.rational;
