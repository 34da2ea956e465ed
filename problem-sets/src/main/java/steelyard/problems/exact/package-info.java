/**
 * Exact arithmetic on doubles: numbers of the form integer times power of two, and an accumulator
 * that holds any sum of doubles and of products of two doubles. Nothing here rounds except where a
 * method says that it does, and nothing knows a problem.
 */
package steelyard.problems.exact;
