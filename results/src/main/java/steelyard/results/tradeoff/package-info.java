/**
 * Error beside time: which time belongs to which error, and which candidates are on the frontier.
 * No rendering and no requirement of a user has a place here.
 */
package steelyard.results.tradeoff;
