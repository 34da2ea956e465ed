/**
 * Assertions on the accuracy of a kernel, for the tests of whoever owns it. They measure with the
 * harness and say what they found; no error is computed here, and no verdict made.
 */
package steelyard.junit;
