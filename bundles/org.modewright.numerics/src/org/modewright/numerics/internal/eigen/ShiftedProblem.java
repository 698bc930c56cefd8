package org.modewright.numerics.internal.eigen;

import java.util.Arrays;
import java.util.Random;

import org.modewright.numerics.EigenProblem;
import org.modewright.numerics.Factorisation;
import org.modewright.numerics.Factoriser;
import org.modewright.numerics.Inertia;
import org.modewright.numerics.PencilReduction;
import org.modewright.numerics.Progress;
import org.modewright.numerics.SingularPencilException;
import org.modewright.numerics.internal.sparse.SparseFactoriser;

/**
 * An eigenproblem with the factors of K - &sigma;M, the shift &sigma; lying below every finite eigenvalue: 0 where K is positive definite,
 * negative for free bodies and buckled structures.
 */
final class ShiftedProblem {

    private static final int SCALE_ITERATIONS = 8;
    private static final int SHIFT_ATTEMPTS = 60;
    private static final int NAMED_MOTIONS = 100;
    private static final int REMOVED_MOTIONS = 200;
    /** Eigenvalues below this share of the largest ratio of the diagonals may be round-off of the stiffness. */
    private static final double TINY = 1e-15;
    /** Share of a flexibility below which the next one is that of another kind of motion: a thousandth of its period. */
    private static final double GAP = 1e-6;
    private static final int ROUND_OFF_MOTIONS = 10;
    private static final long SEED = 4711L;

    private final EigenProblem problem;
    private final Factoriser factoriser;
    private final int massRank;
    private double shift;
    private Factorisation factorisation;
    private int negativeInfinities;
    private int stiffnessZeros;
    private boolean hasRoundOffMotions;

    private ShiftedProblem(EigenProblem problem, Progress progress) {
        this.problem = problem;
        SparseFactoriser sparse = SparseFactoriser.forPattern(problem.stiffness(), problem.mass(), progress);
        this.factoriser = sparse;
        this.massRank = MassRank.of(problem.mass(), sparse, progress);
    }

    /**
     * Chooses the shift and factorises.
     *
     * @throws SingularPencilException if K and M share a null vector
     * @throws IllegalArgumentException if the mass has a negative eigenvalue
     */
    static ShiftedProblem of(EigenProblem problem, Progress progress) {
        ShiftedProblem shifted = new ShiftedProblem(problem, progress);
        shifted.chooseShift(progress);
        return shifted;
    }

    private void chooseShift(Progress progress) {
        Factorisation unshifted = factorise(0.0, progress);
        Inertia inertia = unshifted.inertia();
        stiffnessZeros = inertia.zero();
        if (stiffnessZeros > 0) {
            refuseCommonNullVectors(progress);
        }
        if (inertia.negative() > 0) {
            negativeInfinities = countNegativeInfinities(progress);
        }
        boolean definite = stiffnessZeros == 0 && inertia.negative() == negativeInfinities;
        double scale = scale(unshifted, progress);
        if (definite && !hasRoundOffMotions) {
            factorisation = unshifted;
            return;
        }
        // The estimate may be the size of a negative eigenvalue, which a shift must not meet.
        shift = -1.5 * scale;
        for (int attempt = 0; attempt < SHIFT_ATTEMPTS; attempt++) {
            factorisation = factorise(shift, progress);
            Inertia shifted = factorisation.inertia();
            if (shifted.zero() == 0 && shifted.negative() == negativeInfinities) {
                return;
            }
            shift *= 4.0;
        }
        throw new ArithmeticException("No shift lies below all eigenvalues: the stiffness is indefinite for motions without mass, or the"
                + " mass is not positive semidefinite.");
    }

    private void refuseCommonNullVectors(Progress progress) {
        PencilReduction reduction = PencilReduction.of(problem, factoriser, progress);
        if (!reduction.isEmpty()) {
            int[] degreesOfFreedom = reduction.droppedDegreesOfFreedom();
            double[][] vectors = new double[Math.min(degreesOfFreedom.length, NAMED_MOTIONS)][];
            for (int i = 0; i < vectors.length; i++) {
                vectors[i] = reduction.nullVector(i);
            }
            throw new SingularPencilException(vectors, degreesOfFreedom);
        }
    }

    /**
     * Negative eigenvalues of K - &sigma;M for &sigma; to minus infinity: those of K on the motions without mass. They belong to no finite
     * eigenvalue.
     */
    private int countNegativeInfinities(Progress progress) {
        double far = -10.0 * largestDiagonalRatio();
        Inertia inertia = factorise(far, progress).inertia();
        for (int attempt = 0; attempt < SHIFT_ATTEMPTS; attempt++) {
            Inertia farther = factorise(8.0 * far, progress).inertia();
            if (farther.negative() == inertia.negative()) {
                return farther.negative();
            }
            inertia = farther;
            far *= 8.0;
        }
        return inertia.negative();
    }

    private double largestDiagonalRatio() {
        double[] stiffness = problem.stiffness().diagonal();
        double[] mass = problem.mass().diagonal();
        double largest = 0.0;
        for (int i = 0; i < mass.length; i++) {
            if (mass[i] > 0.0) {
                largest = Math.max(largest, Math.abs(stiffness[i]) / mass[i]);
            }
        }
        return largest > 0.0 ? largest : 1.0;
    }

    /**
     * Estimate of the smallest eigenvalue that is not zero, by power iteration with the flexibility of the structure held at its zero
     * pivots, on the M-orthogonal complement of the motions without stiffness: loads in equilibrium deform it as if it were free. Motions
     * whose stiffness is nothing but round-off of the matrix, yet no zero pivot, count among those without: a shift as small as their
     * eigenvalue would leave no digits to the others. At most the largest ratio of the diagonals, which is all there is where nothing
     * deforms.
     */
    private double scale(Factorisation held, Progress progress) {
        // So many mechanisms are no structure to be tuned for; they would fill the memory.
        double[][] motions = stiffnessZeros > REMOVED_MOTIONS ? new double[0][]
                : massOrthonormal(factoriser.nullVectors(held), progress);
        double largest = largestDiagonalRatio();
        double[] x = start();
        double flexibility = softest(held, motions, x, progress);
        double next = flexibility;
        for (int found = 0; (next * largest > 1.0 / TINY || isRoundOff(x)) && found < ROUND_OFF_MOTIONS; found++) {
            double before = next;
            motions = Arrays.copyOf(motions, motions.length + 1);
            motions[motions.length - 1] = x;
            x = start();
            next = softest(held, motions, x, progress);
            if (next < GAP * before) {
                hasRoundOffMotions = true;
                flexibility = next;
            }
        }
        return flexibility * largest > 1.0 ? 1.0 / flexibility : largest;
    }

    private boolean isRoundOff(double[] x) {
        double energy = Math.abs(problem.stiffness().quadratic(x));
        return energy <= EigenPairChecks.ENERGY_ROUND_OFF * EigenPairChecks.energyOfSizes(problem.stiffness(), x);
    }

    private double[] start() {
        return new Random(SEED).doubles(problem.order(), -1.0, 1.0).toArray();
    }

    /**
     * The largest flexibility on the M-orthogonal complement of some motions.
     *
     * @param x where to start; afterwards the motion of that flexibility, of M-norm 1, or 0 if nothing moves
     */
    private double softest(Factorisation held, double[][] motions, double[] x, Progress progress) {
        double flexibility = 0.0;
        for (int iteration = 0; iteration <= SCALE_ITERATIONS; iteration++) {
            progress.checkCancelled();
            removeMotions(x, motions);
            double norm = Math.sqrt(Math.max(0.0, problem.mass().quadratic(x)));
            if (norm == 0.0) {
                break;
            }
            VectorMath.scale(x, 1.0 / norm);
            if (iteration == SCALE_ITERATIONS) {
                break;
            }
            double[] next = problem.mass().multiply(x);
            double[] massTimesX = next.clone();
            held.solve(next);
            removeMotions(next, motions);
            flexibility = Math.abs(VectorMath.dot(massTimesX, next));
            System.arraycopy(next, 0, x, 0, x.length);
        }
        return flexibility;
    }

    private double[][] massOrthonormal(double[][] motions, Progress progress) {
        double[][] orthonormal = new double[motions.length][];
        for (int j = 0; j < motions.length; j++) {
            progress.checkCancelled();
            double[] x = motions[j].clone();
            removeMotions(x, Arrays.copyOf(orthonormal, j));
            removeMotions(x, Arrays.copyOf(orthonormal, j));
            double norm = Math.sqrt(Math.max(0.0, problem.mass().quadratic(x)));
            VectorMath.scale(x, norm > 0.0 ? 1.0 / norm : 0.0);
            orthonormal[j] = x;
        }
        return orthonormal;
    }

    private void removeMotions(double[] x, double[][] motions) {
        double[][] massTimesX = {problem.mass().multiply(x)};
        double[][] h = BlockOperations.transposedProduct(motions, motions.length, massTimesX);
        BlockOperations.subtractProduct(new double[][] {x}, motions, motions.length, h);
    }

    private Factorisation factorise(double at, Progress progress) {
        return factoriser.factorise(problem.stiffness(), problem.mass(), at, progress);
    }

    /**
     * Number of finite eigenvalues below a shift. Where the shift meets an eigenvalue it is moved up a little.
     *
     * @param at where to count
     * @param spacing distance by which the shift may be moved
     */
    Count count(double at, double spacing, Progress progress) {
        double where = at;
        Inertia inertia = factorise(where, progress).inertia();
        for (int attempt = 1; inertia.zero() > 0 && attempt <= 6; attempt++) {
            where = at + spacing * attempt / 7.0;
            inertia = factorise(where, progress).inertia();
        }
        return new Count(where, inertia.negative() - negativeInfinities);
    }

    /**
     * Result of a count.
     *
     * @param shift where the eigenvalues were counted
     * @param below number of finite eigenvalues below
     */
    record Count(double shift, int below) {
    }

    /** Rank of M, which is the number of finite eigenvalues. */
    int massRank() {
        return massRank;
    }

    EigenProblem problem() {
        return problem;
    }

    double shift() {
        return shift;
    }

    Factorisation factorisation() {
        return factorisation;
    }

    /** Whether K is singular, or so nearly that some eigenvalues are but round-off beside the others. */
    boolean isNearlySingular() {
        return stiffnessZeros > 0 || hasRoundOffMotions;
    }

    /** W &larr; (K - &sigma;M)<sup>-1</sup> M V. */
    double[][] apply(double[][] v) {
        double[][] w = new double[v.length][];
        for (int c = 0; c < v.length; c++) {
            w[c] = problem.mass().multiply(v[c]);
        }
        factorisation.solve(w);
        return w;
    }
}
