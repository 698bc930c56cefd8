package org.modewright.numerics;

/**
 * Numbers of negative, zero and positive eigenvalues of a symmetric matrix. By Sylvester's law they are those of D in LDL<sup>T</sup>.
 *
 * @param negative number of negative eigenvalues
 * @param zero number of eigenvalues that cannot be told from zero
 * @param positive number of positive eigenvalues
 */
public record Inertia(int negative, int zero, int positive) {
}
