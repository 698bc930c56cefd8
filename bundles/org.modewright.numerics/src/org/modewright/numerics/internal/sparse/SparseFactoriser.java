package org.modewright.numerics.internal.sparse;

import java.util.Arrays;

import org.modewright.numerics.Factorisation;
import org.modewright.numerics.Factoriser;
import org.modewright.numerics.Progress;
import org.modewright.numerics.SymmetricMatrix;

/**
 * Sparse LDL<sup>T</sup>. For a shift that is not positive the matrix is first taken to be positive semidefinite and factorised without
 * pivoting; if it is not, or the shift is positive, pivots are chosen for stability, so that the inertia is right.
 */
public final class SparseFactoriser implements Factoriser {

    private final SymmetricMatrix stiffnessPattern;
    private final SymmetricMatrix massPattern;
    private final SymbolicFactorisation symbolic;
    private final EntryMap stiffnessEntries;
    private final EntryMap massEntries;

    private SparseFactoriser(SymmetricMatrix stiffness, SymmetricMatrix mass, SymbolicFactorisation symbolic) {
        this.stiffnessPattern = stiffness;
        this.massPattern = mass;
        this.symbolic = symbolic;
        this.stiffnessEntries = EntryMap.of(stiffness, symbolic.position());
        this.massEntries = mass == null ? null : EntryMap.of(mass, symbolic.position());
    }

    /**
     * Analyses a pattern.
     *
     * @param stiffness pattern of K
     * @param mass pattern of M; null if only K is to be factorised
     * @param progress told of the ordering; a cancel is obeyed
     */
    public static SparseFactoriser forPattern(SymmetricMatrix stiffness, SymmetricMatrix mass, Progress progress) {
        if (mass != null && mass.order() != stiffness.order()) {
            throw new IllegalArgumentException("Stiffness has order " + stiffness.order() + " and mass has order " + mass.order() + ".");
        }
        SymbolicFactorisation symbolic = mass == null ? SymbolicFactorisation.of(progress, stiffness)
                : SymbolicFactorisation.of(progress, stiffness, mass);
        return new SparseFactoriser(stiffness, mass, symbolic);
    }

    /**
     * A factoriser, without shifts, for another matrix in the order of elimination of this one: its entries must be part of this pattern.
     *
     * @param part pattern of the other matrix
     */
    public SparseFactoriser forPart(SymmetricMatrix part) {
        if (part.order() != symbolic.order()) {
            throw new IllegalArgumentException("A matrix of order " + part.order() + " is no part of one of order " + symbolic.order() + ".");
        }
        return new SparseFactoriser(part, null, symbolic);
    }

    @Override
    public Factorisation factorise(SymmetricMatrix k, SymmetricMatrix m, double shift, Progress progress) {
        check(k, m, shift);
        double[] scale = scale(k, m, shift);
        if (shift <= 0.0) {
            try {
                return elimination(k, m, shift, scale, false, progress).run();
            } catch (IndefiniteMatrixException indefinite) {
                progress.report("Factorising anew with pivoting", Double.NaN);
            }
        }
        try {
            return elimination(k, m, shift, scale, true, progress).run();
        } catch (IndefiniteMatrixException impossible) {
            throw new IllegalStateException("Pivoting elimination refused an indefinite matrix.", impossible);
        }
    }

    private MultifrontalElimination elimination(SymmetricMatrix k, SymmetricMatrix m, double shift, double[] scale, boolean pivoting,
            Progress progress) {
        return new MultifrontalElimination(symbolic, k, stiffnessEntries, m, massEntries, shift, scale, pivoting, progress);
    }

    private void check(SymmetricMatrix k, SymmetricMatrix m, double shift) {
        if (!Double.isFinite(shift)) {
            throw new IllegalArgumentException("The shift is " + shift + "; it must be a finite number.");
        }
        if (!samePattern(k, stiffnessPattern)) {
            throw new IllegalArgumentException("The stiffness does not have the pattern that this factoriser was made for.");
        }
        if (shift != 0.0 && (m == null || massPattern == null || !samePattern(m, massPattern))) {
            throw new IllegalArgumentException("A shift needs a mass of the pattern that this factoriser was made for.");
        }
    }

    private static boolean samePattern(SymmetricMatrix a, SymmetricMatrix b) {
        return a == b || a.order() == b.order() && a.entries() == b.entries() && Arrays.equals(a.columnStart(), b.columnStart())
                && Arrays.equals(a.row(), 0, a.entries(), b.row(), 0, b.entries());
    }

    /** By position: a power of two near the inverse root of |k<sub>ii</sub>| + |shift| |m<sub>ii</sub>|, or of the row's largest entry. */
    private double[] scale(SymmetricMatrix k, SymmetricMatrix m, double shift) {
        double[] size = absolute(k.diagonal());
        if (shift != 0.0) {
            double[] mass = m.diagonal();
            for (int i = 0; i < size.length; i++) {
                size[i] += Math.abs(shift * mass[i]);
            }
        }
        double[] largest = largestOfRows(k, size);
        double[] scale = new double[size.length];
        for (int i = 0; i < size.length; i++) {
            double reference = size[i] > 0.0 ? size[i] : largest[i];
            int exponent = reference > 0.0 ? Math.getExponent(reference) : 0;
            scale[symbolic.position()[i]] = Math.scalb(1.0, -Math.floorDiv(exponent, 2));
        }
        return scale;
    }

    private static double[] absolute(double[] values) {
        for (int i = 0; i < values.length; i++) {
            values[i] = Math.abs(values[i]);
        }
        return values;
    }

    private static double[] largestOfRows(SymmetricMatrix k, double[] diagonal) {
        double[] largest = diagonal.clone();
        for (int column = 0; column < k.order(); column++) {
            for (int p = k.columnStart()[column]; p < k.columnStart()[column + 1]; p++) {
                double size = Math.abs(k.value()[p]);
                largest[column] = Math.max(largest[column], size);
                largest[k.row()[p]] = Math.max(largest[k.row()[p]], size);
            }
        }
        return largest;
    }

    @Override
    public double[] nullVector(Factorisation factorisation, double[] weights) {
        if (!(factorisation instanceof SparseFactorisation sparse) || sparse.symbolic() != symbolic) {
            throw new IllegalArgumentException("The factorisation was made by another factoriser.");
        }
        return sparse.nullVector(weights);
    }

    /** Nonzeros of the factor, the diagonal included. */
    public long factorEntries() {
        return symbolic.factorEntries();
    }
}
