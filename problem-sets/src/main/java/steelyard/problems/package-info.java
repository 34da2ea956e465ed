/**
 * What a problem is: stored doubles, a certified answer, an achieved condition number, and the
 * judging of any answer. Nothing here knows a candidate, a table or a command.
 */
package steelyard.problems;
