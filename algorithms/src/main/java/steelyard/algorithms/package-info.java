/**
 * What a candidate is: a kernel with its name, its published source, the bound it claims and the
 * inputs it is for. Nothing here knows a problem, an error or a file.
 */
package steelyard.algorithms;
