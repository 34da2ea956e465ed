package steelyard.algorithms.solve;

/**
 * A matrix as orthonormal columns times an upper triangular matrix.
 *
 * @param q the orthonormal columns, each as one row of this array
 * @param r the upper triangular factor
 */
record QrFactors(double[][] q, double[][] r) {}
