package org.modewright.fem.internal;

/**
 * The motions u = T q that constraints leave: u holds the six components of every node, q the free unknowns, each of which is itself
 * a component of a node. T is kept by rows.
 */
public final class Transformation {

    private final int[] start;
    private final int[] unknown;
    private final double[] factor;
    private final int[] component;

    private Transformation(int[] start, int[] unknown, double[] factor, int[] component) {
        this.start = start;
        this.unknown = unknown;
        this.factor = factor;
        this.component = component;
    }

    static Transformation of(boolean[] held, ConstraintElimination elimination, double[] scale) {
        int[] number = new int[held.length];
        int count = 0;
        int terms = 0;
        for (int i = 0; i < held.length; i++) {
            LinearForm form = elimination.expression(i);
            number[i] = held[i] || form != null ? -1 : count++;
            terms += number[i] >= 0 ? 1 : form == null ? 0 : form.size();
        }
        int[] start = new int[held.length + 1];
        int[] unknown = new int[terms];
        double[] factor = new double[terms];
        int[] component = new int[count];
        int place = 0;
        for (int i = 0; i < held.length; i++) {
            LinearForm form = elimination.expression(i);
            if (number[i] >= 0) {
                component[number[i]] = i;
                unknown[place] = number[i];
                factor[place++] = 1.0;
            } else if (form != null) {
                for (int k = 0; k < form.size(); k++) {
                    unknown[place] = number[form.unknown(k)];
                    factor[place++] = form.factor(k) * scale[form.unknown(k)] / scale[i];
                }
            }
            start[i + 1] = place;
        }
        return new Transformation(start, unknown, factor, component);
    }

    /** Number of free unknowns. */
    public int unknowns() {
        return component.length;
    }

    /** Number of components of all nodes. */
    public int components() {
        return start.length - 1;
    }

    /** The component of a node, 6 node + component, that an unknown is. */
    public int componentOf(int free) {
        return component[free];
    }

    /** Where row i of T begins; row i ends where the next begins. */
    int rowStart(int i) {
        return start[i];
    }

    int unknownAt(int place) {
        return unknown[place];
    }

    double factorAt(int place) {
        return factor[place];
    }

    /** Whether the constraints hold component i altogether. */
    public boolean isHeld(int i) {
        return start[i] == start[i + 1];
    }

    /** u = T q. */
    public double[] expand(double[] q) {
        double[] u = new double[components()];
        for (int i = 0; i < u.length; i++) {
            double sum = 0.0;
            for (int place = start[i]; place < start[i + 1]; place++) {
                sum += factor[place] * q[unknown[place]];
            }
            u[i] = sum;
        }
        return u;
    }

    /** T<sup>T</sup> f. */
    public double[] reduce(double[] f) {
        double[] reduced = new double[unknowns()];
        for (int i = 0; i < f.length; i++) {
            for (int place = start[i]; place < start[i + 1]; place++) {
                reduced[unknown[place]] += factor[place] * f[i];
            }
        }
        return reduced;
    }
}
