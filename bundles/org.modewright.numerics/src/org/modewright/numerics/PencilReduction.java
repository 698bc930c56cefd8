package org.modewright.numerics;

import java.util.Arrays;
import java.util.Random;
import java.util.function.IntFunction;

/**
 * Takes the motions with neither stiffness nor mass out of K &phi; = &lambda; M &phi;: the common null space of K and M, which is the
 * null space of K + &alpha;M for positive &alpha; if both are positive semidefinite. One degree of freedom per motion is dropped, that
 * is held at zero; the others keep their equations.
 *
 * <p>A motion counts as such if its energy cannot be told from the round-off of K + &alpha;M: the pivot d of its degree of freedom in
 * LDL<sup>T</sup> satisfies |d| &le; 16 &epsilon; |x|<sup>T</sup>|L||D||L<sup>T</sup>||x|, x being the motion. The rule does not depend on
 * units, and a stiffness that is a billion times softer than its neighbours is still a stiffness.
 */
public final class PencilReduction {

    private static final int ATTEMPTS = 4;
    private static final double NEGLIGIBLE_MASS = 1e-10;
    private static final long SEED = 97L;

    private final EigenProblem original;
    private final int[] dropped;
    private final IntFunction<double[]> nullVector;
    private double[][] nullVectors;
    private final int[] kept;
    private final EigenProblem reduced;

    private PencilReduction(EigenProblem original, int[] dropped, IntFunction<double[]> nullVector) {
        this.original = original;
        this.dropped = dropped;
        this.nullVector = nullVector;
        this.kept = complement(original.order(), dropped);
        this.reduced = dropped.length == 0 ? original
                : new EigenProblem(restrict(original.stiffness(), kept), restrict(original.mass(), kept));
    }

    /**
     * Looks for the motions.
     *
     * @param problem K and M
     * @param progress told of the factorisation; a cancel is obeyed
     * @throws CancelledException on a cancel
     */
    public static PencilReduction of(EigenProblem problem, Progress progress) {
        Factoriser factoriser = Factorisers.sparse(problem, progress);
        return of(problem, factoriser, progress);
    }

    /**
     * Looks for the motions with a factoriser at hand.
     *
     * @param problem K and M
     * @param factoriser made for their patterns
     * @param progress told of the factorisation; a cancel is obeyed
     */
    public static PencilReduction of(EigenProblem problem, Factoriser factoriser, Progress progress) {
        double balance = balance(problem);
        Factorisation best = null;
        for (int attempt = 0; attempt < ATTEMPTS; attempt++) {
            // An indefinite K may cancel the mass for one weight by accident, but not for several.
            double weight = balance * Math.pow(1.7, attempt);
            Factorisation factorisation = factoriser.factorise(problem.stiffness(), problem.mass(), -weight, progress);
            if (best == null || factorisation.inertia().zero() < best.inertia().zero()) {
                best = factorisation;
            }
            if (best.inertia().zero() == 0 || isWithoutMass(problem.mass(), factoriser, best)) {
                break;
            }
        }
        Factorisation chosen = best;
        return new PencilReduction(problem, chosen.zeroPivots(), index -> factoriser.nullVector(chosen, index));
    }

    /** Geometric mean of the ratios of the diagonals, so that neither matrix hides the other. */
    private static double balance(EigenProblem problem) {
        double[] stiffness = problem.stiffness().diagonal();
        double[] mass = problem.mass().diagonal();
        double sum = 0.0;
        int count = 0;
        for (int i = 0; i < stiffness.length; i++) {
            if (stiffness[i] != 0.0 && mass[i] > 0.0) {
                sum += Math.log(Math.abs(stiffness[i]) / mass[i]);
                count++;
            }
        }
        return count == 0 ? 1.0 : Math.exp(sum / count);
    }

    /** A random combination of the motions has no mass only if none of them has. */
    private static boolean isWithoutMass(SymmetricMatrix mass, Factoriser factoriser, Factorisation factorisation) {
        double[] weights = new Random(SEED).doubles(factorisation.inertia().zero(), 0.5, 1.5).toArray();
        double[] motion = factoriser.nullVector(factorisation, weights);
        double[] diagonal = mass.diagonal();
        double reference = 0.0;
        for (int i = 0; i < motion.length; i++) {
            reference += diagonal[i] * motion[i] * motion[i];
        }
        return mass.quadratic(motion) <= NEGLIGIBLE_MASS * reference;
    }

    private static int[] complement(int order, int[] dropped) {
        int[] kept = new int[order - dropped.length];
        int filled = 0;
        int next = 0;
        for (int i = 0; i < order; i++) {
            if (next < dropped.length && dropped[next] == i) {
                next++;
            } else {
                kept[filled++] = i;
            }
        }
        return kept;
    }

    private static SymmetricMatrix restrict(SymmetricMatrix matrix, int[] kept) {
        int[] newIndex = new int[matrix.order()];
        Arrays.fill(newIndex, -1);
        for (int i = 0; i < kept.length; i++) {
            newIndex[kept[i]] = i;
        }
        int[] columnStart = new int[kept.length + 1];
        int[] row = new int[matrix.entries()];
        double[] value = new double[matrix.entries()];
        int count = 0;
        for (int column = 0; column < kept.length; column++) {
            for (int p = matrix.columnStart()[kept[column]]; p < matrix.columnStart()[kept[column] + 1]; p++) {
                if (newIndex[matrix.row()[p]] >= 0) {
                    row[count] = newIndex[matrix.row()[p]];
                    value[count++] = matrix.value()[p];
                }
            }
            columnStart[column + 1] = count;
        }
        return new SymmetricMatrix(kept.length, columnStart, Arrays.copyOf(row, count), Arrays.copyOf(value, count));
    }

    /** Whether there is nothing to drop. */
    public boolean isEmpty() {
        return dropped.length == 0;
    }

    /** Degrees of freedom to drop, ascending, one per motion. */
    public int[] droppedDegreesOfFreedom() {
        return dropped.clone();
    }

    /** Degrees of freedom that stay, ascending: row i of the reduced problem is row keptDegreesOfFreedom()[i] of the original one. */
    public int[] keptDegreesOfFreedom() {
        return kept.clone();
    }

    /** All the motions, one per dropped degree of freedom and in their order: 1 at its own, 0 at the others. Computed by the first call. */
    public synchronized double[][] nullVectors() {
        if (nullVectors == null) {
            double[][] vectors = new double[dropped.length][];
            for (int i = 0; i < vectors.length; i++) {
                vectors[i] = nullVector(i);
            }
            nullVectors = vectors;
        }
        return nullVectors;
    }

    /** One of the motions, where all of them would take too much memory. */
    public double[] nullVector(int index) {
        return nullVector.apply(index);
    }

    /** The problem without the dropped degrees of freedom; the original one if there is nothing to drop. */
    public EigenProblem reduced() {
        return reduced;
    }

    /** A vector of the reduced problem with zeros at the dropped degrees of freedom. */
    public double[] expand(double[] reducedVector) {
        double[] expanded = new double[original.order()];
        for (int i = 0; i < kept.length; i++) {
            expanded[kept[i]] = reducedVector[i];
        }
        return expanded;
    }
}
