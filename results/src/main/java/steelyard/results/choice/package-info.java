/**
 * The answer to a user's question: which candidate is the fastest that meets an accuracy
 * requirement. Every figure comes from the rows; nothing is measured or judged anew here.
 */
package steelyard.results.choice;
