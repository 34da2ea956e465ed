package steelyard.problems.solve.rational;

import java.math.BigInteger;
import java.util.Optional;

/**
 * Rational numbers from their residues: the fraction a/b with a = b x modulo m, small a and small
 * b, found by the extended Euclidean algorithm stopped half-way. There is at most one with 2|a|b
 * &lt; m.
 *
 * @see "P. S. Wang, M. J. T. Guy and J. H. Davenport, P-adic reconstruction of rational numbers,
 *     SIGSAM Bulletin 16 (1982), 2-3 (from memory)"
 */
final class Reconstruction {

  // Bits by which a guess must undercut the modulus: a wrong one does so by chance alone.
  private static final int SLACK = 20;

  private final BigInteger modulus;

  Reconstruction(BigInteger modulus) {
    this.modulus = modulus;
  }

  /**
   * Returns the vector with given residues; empty if none has a small enough common denominator.
   * That the vector is the one looked for remains to be proved.
   */
  Optional<RationalVector> vector(BigInteger[] residues) {
    BigInteger denominator = BigInteger.ONE;
    BigInteger[] numerators = new BigInteger[residues.length];
    for (int i = 0; i < residues.length; i++) {
      BigInteger multiple = symmetric(residues[i].multiply(denominator).mod(modulus));
      if (isSmall(multiple, denominator)) {
        numerators[i] = multiple;
        continue;
      }
      BigInteger factor = denominator(multiple.mod(modulus));
      BigInteger wider = denominator.multiply(factor);
      BigInteger numerator = symmetric(residues[i].multiply(wider).mod(modulus));
      if (!isSmall(numerator, wider)) {
        return Optional.empty();
      }
      for (int earlier = 0; earlier < i; earlier++) {
        numerators[earlier] = numerators[earlier].multiply(factor);
      }
      numerators[i] = numerator;
      denominator = wider;
    }
    return Optional.of(new RationalVector(numerators, denominator));
  }

  private boolean isSmall(BigInteger numerator, BigInteger denominator) {
    return numerator.bitLength() + denominator.bitLength() + SLACK < modulus.bitLength();
  }

  private BigInteger symmetric(BigInteger residue) {
    BigInteger negative = residue.subtract(modulus);
    return negative.negate().compareTo(residue) < 0 ? negative : residue;
  }

  private BigInteger denominator(BigInteger residue) {
    int half = modulus.bitLength() / 2;
    BigInteger last = modulus;
    BigInteger current = residue;
    BigInteger lastFactor = BigInteger.ZERO;
    BigInteger factor = BigInteger.ONE;
    while (current.bitLength() > half) {
      BigInteger[] parts = last.divideAndRemainder(current);
      BigInteger next = lastFactor.subtract(parts[0].multiply(factor));
      last = current;
      current = parts[1];
      lastFactor = factor;
      factor = next;
    }
    return factor.abs();
  }
}
