package org.modewright.numerics;

/**
 * Eigenpairs, ascending. The arrays are shared, not copied.
 *
 * @param values &lambda;<sub>i</sub>, ascending; where K is singular or nearly so, exactly 0 if |&lambda;| is below the round-off of K
 *        and of the shift &sigma; that the solution went through, |&lambda;| &le; 64 &epsilon; (|&phi;|<sup>T</sup>|K||&phi;| + |&sigma;|)
 *        with &epsilon; = 2<sup>-52</sup>
 * @param vectors vectors[i] = &phi;<sub>i</sub> of length n with &phi;<sub>i</sub><sup>T</sup>M&phi;<sub>j</sub> = &delta;<sub>ij</sub>,
 *        its largest component positive
 * @param residuals ||K&phi; - &lambda;M&phi;||<sub>2</sub> / ||K&phi;||<sub>2</sub>; for &lambda; = 0 the denominator is
 *        ||K||<sub>1</sub> ||&phi;||<sub>2</sub> instead, because K&phi; itself is round-off
 * @param errorBounds bound on |&lambda;<sub>i</sub> - &lambda;| for the eigenvalue &lambda; nearest to it, in the units of &lambda;: the
 *        residual bound of B. N. Parlett, The Symmetric Eigenvalue Problem (SIAM 1998), section 15.9, for the
 *        spectrally transformed problem
 * @param exhausted whether the pencil has no more finite eigenvalues than these
 */
public record EigenPairs(double[] values, double[][] vectors, double[] residuals, double[] errorBounds, boolean exhausted) {

    /** Number of pairs. */
    public int count() {
        return values.length;
    }
}
