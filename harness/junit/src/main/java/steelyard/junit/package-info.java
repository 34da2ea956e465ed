/**
 * Assertions on the accuracy of a kernel, for the tests of whoever owns it: {@code Accuracy} is
 * public, the rest is internal. They try problems with the harness and show the worst; no error is
 * computed here, no verdict made and no time taken.
 */
package steelyard.junit;
