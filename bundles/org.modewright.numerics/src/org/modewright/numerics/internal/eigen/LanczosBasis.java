package org.modewright.numerics.internal.eigen;

import java.util.Arrays;
import java.util.Random;

import org.ejml.data.DMatrixRMaj;
import org.modewright.numerics.Progress;

/**
 * M-orthonormal basis V of a Krylov space of A = (K - &sigma;M)<sup>-1</sup>M, built by block Lanczos with full reorthogonalisation
 * (R. G. Grimes, J. G. Lewis, H. D. Simon, A shifted block Lanczos algorithm, SIAM J. Matrix Anal. Appl. 15 (1994) 228-272) and thick
 * restart (K. Wu, H. Simon, SIAM J. Matrix Anal. Appl. 22 (2000) 602-616). Always A V = V T + Q C<sup>T</sup> with Q the next block,
 * M-orthonormal to V.
 */
final class LanczosBasis {

    /** A remainder below this share of the operator's norm is round-off. */
    private static final double DEPENDENT = 1e-12;
    /** So is a vector whose mass is a smaller share than this of the mass it would have without cancellation. */
    private static final double MASSLESS = 1e-10;
    /** A column that loses more than this share of its length is orthogonalised once more. */
    private static final double CANCELLED = 1e-2;
    private static final int RANDOM_ATTEMPTS = 3;
    private static final long SEED = 20240229L;

    private final ShiftedProblem shifted;
    private final int dimension;
    private final double[] massDiagonal;
    private final Random random = new Random(SEED);

    private double[][] v = new double[16][];
    private int size;
    private double[][] t = new double[16][16];
    private double[][] next = {};
    /** Largest M-norm of A times an M-normalised vector so far. */
    private double operatorNorm;
    /** C: one row per basis vector, one column per vector of the next block. */
    private double[][] coupling = {};

    /**
     * An empty basis.
     *
     * @param shifted gives A
     * @param dimension dimension of the space that A maps into: the rank of M
     */
    LanczosBasis(ShiftedProblem shifted, int dimension) {
        this.shifted = shifted;
        this.dimension = dimension;
        this.massDiagonal = shifted.problem().mass().diagonal();
    }

    int size() {
        return size;
    }

    int nextSize() {
        return next.length;
    }

    boolean isFull() {
        return size >= dimension;
    }

    /** Appends the next block to V and makes another one. */
    void expand() {
        int old = size;
        int width = next.length;
        double[][] w = shifted.apply(next);
        double[] lengths = massNorms(w);
        operatorNorm = Math.max(operatorNorm, Arrays.stream(lengths).max().orElse(0.0));
        append(next);
        double[][] h = orthogonalise(w, size);
        addTo(h, orthogonalise(w, size));
        for (int c = 0; c < width; c++) {
            for (int i = 0; i < old; i++) {
                t[i][old + c] = h[i][c];
                t[old + c][i] = h[i][c];
            }
            for (int a = 0; a <= c; a++) {
                double mean = 0.5 * (h[old + a][c] + h[old + c][a]);
                t[old + a][old + c] = mean;
                t[old + c][old + a] = mean;
            }
        }
        setNext(w, lengths, old);
    }

    private void append(double[][] block) {
        int needed = size + block.length;
        if (needed > v.length) {
            int capacity = Math.max(needed, 2 * v.length);
            v = Arrays.copyOf(v, capacity);
            double[][] larger = new double[capacity][capacity];
            for (int i = 0; i < size; i++) {
                System.arraycopy(t[i], 0, larger[i], 0, size);
            }
            t = larger;
        }
        for (double[] column : block) {
            v[size++] = column;
        }
    }

    /** W &larr; W - V V<sup>T</sup>M W; returns V<sup>T</sup>M W. */
    private double[][] orthogonalise(double[][] w, int count) {
        double[][] massTimesW = new double[w.length][];
        for (int c = 0; c < w.length; c++) {
            massTimesW[c] = shifted.problem().mass().multiply(w[c]);
        }
        double[][] h = BlockOperations.transposedProduct(v, count, massTimesW);
        BlockOperations.subtractProduct(w, v, count, h);
        return h;
    }

    private static void addTo(double[][] sum, double[][] term) {
        for (int i = 0; i < sum.length; i++) {
            for (int j = 0; j < sum[i].length; j++) {
                sum[i][j] += term[i][j];
            }
        }
    }

    private double[] massNorms(double[][] w) {
        double[] norms = new double[w.length];
        for (int c = 0; c < w.length; c++) {
            norms[c] = massNorm(w[c]);
        }
        return norms;
    }

    private double massNorm(double[] x) {
        return Math.sqrt(Math.max(0.0, shifted.problem().mass().quadratic(x)));
    }

    /** Q R of the remainder: its columns become the next block, R the coupling of the block appended last. */
    private void setNext(double[][] w, double[] lengths, int old) {
        double[][] accepted = new double[w.length][];
        double[][] r = new double[w.length][w.length];
        int count = 0;
        for (int c = 0; c < w.length && size + count < dimension; c++) {
            if (acceptColumn(w[c], lengths[c], DEPENDENT * operatorNorm, accepted, count, r, c)) {
                count++;
            }
        }
        next = Arrays.copyOf(accepted, count);
        coupling = new double[size][count];
        for (int c = 0; c < w.length; c++) {
            for (int a = 0; a < count; a++) {
                coupling[old + c][a] = r[a][c];
            }
        }
    }

    private boolean acceptColumn(double[] column, double length, double negligible, double[][] accepted, int count, double[][] r,
            int c) {
        double norm;
        double before = length;
        while (true) {
            double[] projections = project(column, accepted, count);
            for (int a = 0; a < count; a++) {
                r[a][c] += projections[a];
            }
            norm = massNorm(column);
            if (norm <= negligible || isMassless(column, norm)) {
                return false;
            }
            if (norm > CANCELLED * before) {
                break;
            }
            before = norm;
            orthogonalise(new double[][] {column}, size);
        }
        VectorMath.scale(column, 1.0 / norm);
        r[count][c] = norm;
        accepted[count] = column;
        return true;
    }

    private boolean isMassless(double[] column, double norm) {
        double without = 0.0;
        for (int i = 0; i < column.length; i++) {
            without += massDiagonal[i] * column[i] * column[i];
        }
        return norm * norm <= MASSLESS * without;
    }

    private double[] project(double[] column, double[][] accepted, int count) {
        double[] total = new double[count];
        for (int pass = 0; pass < 2 && count > 0; pass++) {
            double[][] massTimes = {shifted.problem().mass().multiply(column)};
            double[][] h = BlockOperations.transposedProduct(accepted, count, massTimes);
            BlockOperations.subtractProduct(new double[][] {column}, accepted, count, h);
            for (int a = 0; a < count; a++) {
                total[a] += h[a][0];
            }
        }
        return total;
    }

    /**
     * Adds random directions to the next block, so that vectors that the Krylov space is blind to come in.
     *
     * @return whether any could be added
     */
    boolean inject(int wanted) {
        boolean any = false;
        for (int k = 0; k < wanted && size + next.length < dimension; k++) {
            any |= injectOne();
        }
        return any;
    }

    private boolean injectOne() {
        for (int attempt = 0; attempt < RANDOM_ATTEMPTS; attempt++) {
            double[][] w = shifted.apply(new double[][] {random.doubles(shifted.problem().order(), -1.0, 1.0).toArray()});
            double length = massNorm(w[0]);
            double[][] accepted = Arrays.copyOf(next, next.length + 1);
            orthogonalise(w, size);
            orthogonalise(w, size);
            if (length > 0.0 && acceptColumn(w[0], length, DEPENDENT * length, accepted, next.length, new double[next.length + 1][1], 0)) {
                next = accepted;
                for (int i = 0; i < size; i++) {
                    coupling[i] = Arrays.copyOf(coupling[i], next.length);
                }
                return true;
            }
        }
        return false;
    }

    RitzPairs ritzPairs(Progress progress) {
        DMatrixRMaj projected = new DMatrixRMaj(size, size);
        for (int i = 0; i < size; i++) {
            System.arraycopy(t[i], 0, projected.data, i * size, size);
        }
        DenseSpectrum spectrum = DenseSpectrum.of(projected, progress);
        double[] residuals = new double[size];
        for (int i = 0; i < size; i++) {
            residuals[i] = VectorMath.norm(couple(spectrum.vectors()[i]));
        }
        return new RitzPairs(spectrum.values(), spectrum.vectors(), residuals);
    }

    private double[] couple(double[] coefficients) {
        double[] coupled = new double[next.length];
        for (int j = 0; j < size; j++) {
            for (int a = 0; a < coupled.length; a++) {
                coupled[a] += coefficients[j] * coupling[j][a];
            }
        }
        return coupled;
    }

    /** Replaces V by the leading Ritz vectors. */
    void restart(RitzPairs ritz, int keep) {
        double[][] kept = Arrays.copyOf(ritz.coefficients(), keep);
        double[][] combined = BlockOperations.combine(v, size, kept);
        double[][] newCoupling = new double[keep][];
        for (int i = 0; i < keep; i++) {
            newCoupling[i] = couple(kept[i]);
        }
        Arrays.fill(v, null);
        System.arraycopy(combined, 0, v, 0, keep);
        for (double[] row : t) {
            Arrays.fill(row, 0.0);
        }
        for (int i = 0; i < keep; i++) {
            t[i][i] = ritz.theta()[i];
        }
        coupling = newCoupling;
        size = keep;
    }

    /** The leading Ritz vectors, purified: A x / &theta; has no components without mass. */
    double[][] purifiedVectors(RitzPairs ritz, int count, Progress progress) {
        double[][] vectors = count == 0 ? new double[0][] : BlockOperations.combine(v, size, Arrays.copyOf(ritz.coefficients(), count));
        int panel = 8;
        for (int start = 0; start < count; start += panel) {
            progress.checkCancelled();
            double[][] purified = shifted.apply(Arrays.copyOfRange(vectors, start, Math.min(count, start + panel)));
            for (int i = 0; i < purified.length; i++) {
                VectorMath.scale(purified[i], 1.0 / ritz.theta()[start + i]);
                vectors[start + i] = purified[i];
            }
        }
        return vectors;
    }
}
