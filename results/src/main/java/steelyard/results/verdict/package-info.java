/**
 * The rules that turn the observations of a candidate into its verdict. They work on observations
 * alone: no time, no file and no rendering has a place here.
 */
package steelyard.results.verdict;
