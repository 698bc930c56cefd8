package org.modewright.numerics.internal.sparse;

import org.modewright.numerics.Progress;

/**
 * Eliminates the fully summed columns of a front: A = L D L<sup>T</sup>.
 * Without pivoting every pivot must be positive or vanish. With pivoting one by one and two by two pivots are taken from the fully
 * summed block if they keep the multipliers below 1/u (I. S. Duff, J. K. Reid, The multifrontal solution of indefinite sparse symmetric
 * linear systems, ACM Trans. Math. Softw. 9 (1983) 302-325; J. R. Bunch, L. Kaufman, Math. Comp. 31 (1977) 163-179); columns
 * without such a pivot are left to the parent front.
 */
final class FrontElimination {

    private static final int BLOCK = 32;
    /** Threshold u. At most 0.35, so that a front whose rows are all fully summed always has a pivot. */
    private static final double THRESHOLD = 0.1;
    /** In pivoting mode the error of a whole column is bounded, not that of the pivot alone. */
    private static final double COLUMN_FACTOR = 100.0;

    private final RankUpdate rankUpdate = new RankUpdate();
    private final boolean pivoting;
    private final ZeroPivotRule.EnergyScale energyScale;
    private final Progress progress;

    private Front front;
    private int negative;
    private double growth;
    private boolean[] vanished = {};
    /** Outcome of the search for the largest entry of a column. */
    private double largest;
    private int largestInBlock;

    FrontElimination(boolean pivoting, ZeroPivotRule.EnergyScale energyScale, Progress progress) {
        this.pivoting = pivoting;
        this.energyScale = energyScale;
        this.progress = progress;
    }

    int negative() {
        return negative;
    }

    double growth() {
        return growth;
    }

    /** By column of the last front: whether its pivot vanished. */
    boolean[] vanished() {
        return vanished;
    }

    /**
     * Eliminates as many columns as it can.
     *
     * @return number of columns eliminated; they stand first
     */
    int eliminate(Front target) throws IndefiniteMatrixException {
        front = target;
        vanished = new boolean[target.fullySummed];
        int done = 0;
        boolean wholeRemainder = false;
        while (done < front.fullySummed) {
            progress.checkCancelled();
            int end = wholeRemainder ? front.fullySummed : Math.min(done + BLOCK, front.fullySummed);
            int first = done;
            done = pivoting ? eliminateBlockWithPivoting(first, end) : eliminateBlock(first, end);
            rankUpdate.apply(front.a, front.size, end, first, done, front.d, front.e);
            if (done == first && end == front.fullySummed) {
                break;
            }
            wholeRemainder = done == first;
            moveToEnd(done, end);
        }
        return done;
    }

    /** Lets the columns that had no pivot in their block wait until the others are eliminated. */
    private void moveToEnd(int from, int end) {
        int count = Math.min(end - from, front.fullySummed - end);
        for (int k = 0; k < count; k++) {
            front.swap(from + k, front.fullySummed - 1 - k);
        }
    }

    private int eliminateBlock(int first, int end) throws IndefiniteMatrixException {
        for (int k = first; k < end; k++) {
            double pivot = front.a[k * front.size + k];
            if (pivot <= ZeroPivotRule.SUSPICIOUS && vanishes(k, k, pivot)) {
                dropColumn(k);
            } else if (pivot > 0.0) {
                eliminateOne(k, end);
            } else {
                throw new IndefiniteMatrixException();
            }
        }
        return end;
    }

    private boolean vanishes(int k, int candidate, double pivot) throws IndefiniteMatrixException {
        double negligible = ZeroPivotRule.UNIT * energyScale.of(front, k, candidate);
        if (Math.abs(pivot) > negligible) {
            return false;
        }
        // In a semidefinite matrix an off-diagonal entry is at most the root of the product of its diagonal entries.
        findLargest(k, candidate, front.fullySummed);
        if (largest > 4.0 * Math.sqrt(negligible)) {
            throw new IndefiniteMatrixException();
        }
        return true;
    }

    private void dropColumn(int k) {
        vanished[k] = true;
        front.d[k] = 0.0;
        front.e[k] = 0.0;
        int column = k * front.size;
        for (int i = k + 1; i < front.size; i++) {
            front.a[column + i] = 0.0;
        }
    }

    private void eliminateOne(int k, int end) {
        int size = front.size;
        double[] a = front.a;
        int column = k * size;
        double pivot = a[column + k];
        front.d[k] = pivot;
        front.e[k] = 0.0;
        if (pivot < 0.0) {
            negative++;
        }
        double inverse = 1.0 / pivot;
        for (int j = k + 1; j < end; j++) {
            double multiplier = a[column + j] * inverse;
            if (multiplier != 0.0) {
                subtractMultiple(a, column + j, j * size + j, multiplier, size - j);
            }
        }
        double greatest = 0.0;
        for (int i = k + 1; i < size; i++) {
            a[column + i] *= inverse;
            greatest = Math.max(greatest, Math.abs(a[column + i]));
        }
        growth = Math.max(growth, greatest);
    }

    private static void subtractMultiple(double[] a, int source, int target, double factor, int length) {
        for (int i = 0; i < length; i++) {
            a[target + i] -= factor * a[source + i];
        }
    }

    private int eliminateBlockWithPivoting(int first, int end) {
        int done = first;
        while (done < end) {
            int taken = takePivot(done, end);
            progress.checkCancelled();
            if (taken == 0) {
                break;
            }
            done += taken;
        }
        return done;
    }

    /** Searches the block for a pivot and eliminates it; returns the number of columns eliminated: 0, 1 or 2. */
    private int takePivot(int k, int end) {
        for (int candidate = k; candidate < end; candidate++) {
            findLargest(k, candidate, end);
            double pivot = front.a[candidate * front.size + candidate];
            if (Math.max(Math.abs(pivot), largest) <= ZeroPivotRule.SUSPICIOUS && columnVanishes(k, candidate, pivot)) {
                front.swap(k, candidate);
                dropColumn(k);
                return 1;
            }
            if (pivot != 0.0 && Math.abs(pivot) >= THRESHOLD * largest) {
                front.swap(k, candidate);
                eliminateOne(k, end);
                return 1;
            }
            int partner = largestInBlock;
            if (partner >= 0 && pairIsStable(k, candidate, partner)) {
                front.swap(k, Math.min(candidate, partner));
                front.swap(k + 1, Math.max(candidate, partner));
                eliminatePair(k, end);
                return 2;
            }
        }
        return 0;
    }

    private boolean columnVanishes(int k, int candidate, double pivot) {
        double scale = energyScale.of(front, k, candidate);
        return Math.abs(pivot) <= ZeroPivotRule.UNIT * scale
                && largest <= COLUMN_FACTOR * ZeroPivotRule.UNIT * Math.max(scale == 0.0 ? 0.0 : 1.0, scale);
    }

    /** Largest off-diagonal entry of a column among the rows not yet eliminated, and the row of the largest within the block. */
    private void findLargest(int k, int column, int end) {
        largest = 0.0;
        largestInBlock = -1;
        double largestOfBlock = 0.0;
        for (int i = k; i < end; i++) {
            double size = i == column ? 0.0 : Math.abs(front.get(i, column));
            if (size > largestOfBlock) {
                largestOfBlock = size;
                largestInBlock = i;
            }
        }
        largest = largestOfBlock;
        int start = column * front.size;
        for (int i = end; i < front.size; i++) {
            largest = Math.max(largest, Math.abs(front.a[start + i]));
        }
    }

    private boolean pairIsStable(int k, int p, int q) {
        double app = front.get(p, p);
        double aqq = front.get(q, q);
        double apq = front.get(p, q);
        double determinant = app * aqq - apq * apq;
        if (Math.abs(determinant) <= THRESHOLD * (Math.abs(app * aqq) + apq * apq)) {
            // A nearly singular pair would hide a vanishing pivot.
            return false;
        }
        double largestP = largestExcept(k, p, q);
        double largestQ = largestExcept(k, q, p);
        double boundP = Math.abs(aqq) * largestP + Math.abs(apq) * largestQ;
        double boundQ = Math.abs(apq) * largestP + Math.abs(app) * largestQ;
        return Math.max(boundP, boundQ) * THRESHOLD <= Math.abs(determinant);
    }

    private double largestExcept(int k, int column, int excluded) {
        double greatest = 0.0;
        for (int i = k; i < front.size; i++) {
            if (i != column && i != excluded) {
                greatest = Math.max(greatest, Math.abs(front.get(i, column)));
            }
        }
        return greatest;
    }

    private void eliminatePair(int k, int end) {
        int size = front.size;
        double[] a = front.a;
        int p = k * size;
        int q = p + size;
        double app = a[p + k];
        double apq = a[p + k + 1];
        double aqq = a[q + k + 1];
        double determinant = app * aqq - apq * apq;
        negative += determinant < 0.0 ? 1 : app < 0.0 ? 2 : 0;
        front.d[k] = app;
        front.d[k + 1] = aqq;
        front.e[k] = apq;
        front.e[k + 1] = 0.0;
        for (int j = k + 2; j < end; j++) {
            double multiplierP = (aqq * a[p + j] - apq * a[q + j]) / determinant;
            double multiplierQ = (app * a[q + j] - apq * a[p + j]) / determinant;
            if (multiplierP != 0.0 || multiplierQ != 0.0) {
                subtractMultiple(a, p + j, j * size + j, multiplierP, size - j);
                subtractMultiple(a, q + j, j * size + j, multiplierQ, size - j);
            }
        }
        double greatest = 0.0;
        for (int i = k + 2; i < size; i++) {
            double multiplierP = (aqq * a[p + i] - apq * a[q + i]) / determinant;
            double multiplierQ = (app * a[q + i] - apq * a[p + i]) / determinant;
            a[p + i] = multiplierP;
            a[q + i] = multiplierQ;
            greatest = Math.max(greatest, Math.max(Math.abs(multiplierP), Math.abs(multiplierQ)));
        }
        a[p + k + 1] = 0.0;
        growth = Math.max(growth, greatest);
    }
}
