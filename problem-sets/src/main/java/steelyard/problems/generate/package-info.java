/**
 * Ways of choosing data that families of several tasks share. Nothing here belongs to one task, and
 * nothing judges an answer.
 */
package steelyard.problems.generate;
