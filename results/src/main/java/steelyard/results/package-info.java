/**
 * The tables: rows, their CSV form, verdicts, and the choice between candidates. It works on rows
 * alone, whoever wrote them, and knows no candidate and no problem.
 */
package steelyard.results;
