package org.modewright.numerics.internal.sparse;

import org.modewright.numerics.Progress;
import org.modewright.numerics.SymmetricMatrix;

/**
 * Multifrontal LDL<sup>T</sup> factorisation (I. S. Duff, J. K. Reid, ACM Trans. Math. Softw. 9 (1983) 302-325; J. W. H. Liu, The
 * multifrontal method for sparse matrix solution: theory and practice, SIAM Review 34 (1992) 82-109) of S (K - &sigma;M) S, where the
 * diagonal S of powers of two brings the diagonal near 1.
 */
final class MultifrontalElimination {

    private final SymbolicFactorisation symbolic;
    private final SymmetricMatrix stiffness;
    private final EntryMap stiffnessEntries;
    private final SymmetricMatrix mass;
    private final EntryMap massEntries;
    private final double shift;
    /** S by position. */
    private final double[] scale;
    private final boolean pivoting;
    private final Progress progress;

    private final FactorBlock[] blocks;
    /** Remainder of each front that its parent has not taken in yet. */
    private final Front[] remainders;
    private final int[] eliminated;
    private final int[] local;
    private final double[] motion;
    private final double[] motionScale;
    private int currentSupernode;

    MultifrontalElimination(SymbolicFactorisation symbolic, SymmetricMatrix stiffness, EntryMap stiffnessEntries, SymmetricMatrix mass,
            EntryMap massEntries, double shift, double[] scale, boolean pivoting, Progress progress) {
        this.symbolic = symbolic;
        this.stiffness = stiffness;
        this.stiffnessEntries = stiffnessEntries;
        this.mass = mass;
        this.massEntries = massEntries;
        this.shift = shift;
        this.scale = scale;
        this.pivoting = pivoting;
        this.progress = progress;
        int supernodes = symbolic.supernodes();
        blocks = new FactorBlock[supernodes];
        remainders = new Front[supernodes];
        eliminated = new int[supernodes];
        local = new int[symbolic.order()];
        motion = new double[symbolic.order()];
        motionScale = new double[symbolic.order()];
    }

    SparseFactorisation run() throws IndefiniteMatrixException {
        double operations = Math.max(1.0, symbolic.operations());
        double done = 0.0;
        FrontElimination elimination = new FrontElimination(pivoting, this::energyScale, progress);
        for (int s = 0; s < symbolic.supernodes(); s++) {
            if (s % 64 == 0) {
                progress.report("Factorising: equation " + symbolic.start(s) + " of " + symbolic.order(), Math.min(1.0, done / operations));
            }
            done += operations(s);
            eliminateFront(s, elimination);
        }
        return new SparseFactorisation(symbolic, blocks, scale, elimination.negative(), elimination.growth());
    }

    private double operations(int supernode) {
        double size = symbolic.width(supernode) + symbolic.rows(supernode).length;
        return symbolic.width(supernode) * size * size;
    }

    private void eliminateFront(int s, FrontElimination elimination) throws IndefiniteMatrixException {
        Front front = new Front(frontIndex(s), fullySummed(s));
        for (int i = 0; i < front.size; i++) {
            local[front.index[i]] = i;
        }
        assemble(s, front, stiffness, stiffnessEntries, 1.0);
        if (shift != 0.0) {
            assemble(s, front, mass, massEntries, -shift);
        }
        for (int child : symbolic.children(s)) {
            if (remainders[child] != null) {
                addRemainder(front, remainders[child], eliminated[child]);
                remainders[child] = null;
            }
        }
        currentSupernode = s;
        int pivots = elimination.eliminate(front);
        if (symbolic.parent(s) < 0 && pivots < front.size) {
            throw new IllegalStateException("No stable pivot among the last " + (front.size - pivots) + " equations.");
        }
        blocks[s] = FactorBlock.of(front, pivots, elimination.vanished());
        eliminated[s] = pivots;
        if (pivots < front.size) {
            remainders[s] = front;
        }
    }

    private int delayed(int child) {
        return remainders[child] == null ? 0 : remainders[child].fullySummed - eliminated[child];
    }

    private int fullySummed(int s) {
        int count = symbolic.width(s);
        for (int child : symbolic.children(s)) {
            count += delayed(child);
        }
        return count;
    }

    /** Delayed columns of the children, own columns, rows below. */
    private int[] frontIndex(int s) {
        int width = symbolic.width(s);
        int[] rows = symbolic.rows(s);
        int[] index = new int[fullySummed(s) + rows.length];
        int filled = 0;
        for (int child : symbolic.children(s)) {
            int delayed = delayed(child);
            if (delayed > 0) {
                System.arraycopy(remainders[child].index, eliminated[child], index, filled, delayed);
                filled += delayed;
            }
        }
        for (int k = 0; k < width; k++) {
            index[filled++] = symbolic.start(s) + k;
        }
        System.arraycopy(rows, 0, index, filled, rows.length);
        return index;
    }

    private void assemble(int s, Front front, SymmetricMatrix matrix, EntryMap entries, double factor) {
        int end = symbolic.start(s) + symbolic.width(s);
        for (int column = symbolic.start(s); column < end; column++) {
            double columnFactor = factor * scale[column];
            int localColumn = local[column];
            for (int q = entries.start()[column]; q < entries.start()[column + 1]; q++) {
                int row = entries.rowPosition()[q];
                front.add(local[row], localColumn, columnFactor * scale[row] * matrix.value()[entries.entry()[q]]);
            }
        }
    }

    private void addRemainder(Front front, Front child, int from) {
        for (int j = from; j < child.size; j++) {
            int column = local[child.index[j]];
            int source = j * child.size;
            int target = column * front.size;
            for (int i = j; i < child.size; i++) {
                int row = local[child.index[i]];
                if (row >= column) {
                    front.a[target + row] += child.a[source + i];
                } else {
                    front.a[row * front.size + column] += child.a[source + i];
                }
            }
        }
    }

    /**
     * s of {@link ZeroPivotRule}: back substitution of the motion through the front and the fronts below it, along with that of its
     * absolute values.
     */
    private double energyScale(Front front, int done, int candidate) {
        double[] x = motion;
        double[] absolute = motionScale;
        int candidatePosition = front.index[candidate];
        for (int i = 0; i < front.size; i++) {
            x[front.index[i]] = 0.0;
        }
        x[candidatePosition] = 1.0;
        double sum = Math.abs(front.a[candidate * front.size + candidate]);
        for (int k = done - 1; k >= 0; k--) {
            substituteColumn(front.index, front.a, k, front.size, candidate, done);
        }
        sum += energy(front.index, front.d, front.e, done, absolute);
        for (int s = currentSupernode - 1; s >= symbolic.firstDescendant(currentSupernode); s--) {
            FactorBlock block = blocks[s];
            for (int k = block.pivots() - 1; k >= 0; k--) {
                substituteColumn(block.index(), block.l(), k, block.rows(), -1, block.rows());
            }
            sum += energy(block.index(), block.d(), block.e(), block.pivots(), absolute);
            if (s % 256 == 0) {
                progress.checkCancelled();
            }
        }
        return sum;
    }

    /** x<sub>k</sub> = - sum of l<sub>ik</sub> x<sub>i</sub>, over the pivots below k, and the candidate where it stands beyond them. */
    private void substituteColumn(int[] index, double[] l, int k, int rows, int candidate, int end) {
        double value = 0.0;
        double absolute = 0.0;
        for (int i = k + 1; i < end; i++) {
            double product = l[k * rows + i] * motion[index[i]];
            value -= product;
            absolute += Math.abs(product);
        }
        if (candidate >= 0) {
            double multiplier = l[k * rows + candidate];
            value -= multiplier;
            absolute += Math.abs(multiplier);
        }
        motion[index[k]] = value;
        motionScale[index[k]] = Math.abs(value) + absolute;
    }

    private static double energy(int[] index, double[] d, double[] e, int pivots, double[] absolute) {
        double sum = 0.0;
        for (int k = 0; k < pivots; k++) {
            double size = absolute[index[k]];
            sum += Math.abs(d[k]) * size * size;
            if (e[k] != 0.0) {
                sum += 2.0 * Math.abs(e[k]) * size * absolute[index[k + 1]];
            }
        }
        return sum;
    }
}
