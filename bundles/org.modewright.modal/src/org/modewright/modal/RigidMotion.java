package org.modewright.modal;

import java.util.ArrayList;
import java.util.List;
import org.modewright.fem.NodePoint;

/**
 * Tells whether motions of a part are those of a rigid body, u<sub>i</sub> = t + &omega; &times; r<sub>i</sub>, and in which directions.
 * The fit is a least-squares one over the translations of the part's nodes; a part that does not translate at all is rigid if all its
 * nodes turn alike. A node that does not turn with the rest is no objection where nothing makes it turn (a pin joint), but is one where a
 * support holds it.
 */
final class RigidMotion {

    private static final double ROUND_OFF = 1e-6;

    private final int[] part;
    private final double[] centre = new double[3];
    private final double size;
    private final List<NodePoint> points;
    private final boolean[] held;
    private final List<double[]> basis = new ArrayList<>();
    private final List<double[]> coefficients = new ArrayList<>();

    /**
     * Of a part.
     *
     * @param part indices of its nodes
     * @param points all nodes
     * @param held six a node: whether a support holds the component
     */
    RigidMotion(int[] part, List<NodePoint> points, boolean[] held) {
        this.part = part;
        this.points = points;
        this.held = held;
        for (int node : part) {
            centre[0] += points.get(node).x() / part.length;
            centre[1] += points.get(node).y() / part.length;
            centre[2] += points.get(node).z() / part.length;
        }
        double largest = 0;
        for (int node : part) {
            double[] arm = arm(node);
            largest = Math.max(largest, Math.sqrt(arm[0] * arm[0] + arm[1] * arm[1] + arm[2] * arm[2]));
        }
        size = largest > 0 ? largest : 1;
        for (int component = 0; component < 6; component++) {
            orthonormalise(component);
        }
    }

    private double[] arm(int node) {
        NodePoint point = points.get(node);
        return new double[] {point.x() - centre[0], point.y() - centre[1], point.z() - centre[2]};
    }

    /** Translations of a unit rigid motion; rotations are scaled by the part's size so that all six compare. */
    private double[] unit(double[] motion) {
        double[] field = new double[3 * part.length];
        for (int i = 0; i < part.length; i++) {
            double[] arm = arm(part[i]);
            double rx = motion[3] / size;
            double ry = motion[4] / size;
            double rz = motion[5] / size;
            field[3 * i] = motion[0] + ry * arm[2] - rz * arm[1];
            field[3 * i + 1] = motion[1] + rz * arm[0] - rx * arm[2];
            field[3 * i + 2] = motion[2] + rx * arm[1] - ry * arm[0];
        }
        return field;
    }

    private void orthonormalise(int component) {
        double[] motion = new double[6];
        motion[component] = 1;
        double[] field = unit(motion);
        double before = norm(field);
        for (int pass = 0; pass < 2; pass++) {
            for (int i = 0; i < basis.size(); i++) {
                double along = dot(basis.get(i), field);
                subtract(field, along, basis.get(i));
                subtract(motion, along, coefficients.get(i));
            }
        }
        double after = norm(field);
        if (after > ROUND_OFF * before && after > 0) {
            scale(field, 1 / after);
            scale(motion, 1 / after);
            basis.add(field);
            coefficients.add(motion);
        }
    }

    /**
     * The rigid motion (translation of the part's centre, rotation) that a nodal shape is on this part.
     *
     * @return six components; null if the shape is no rigid motion
     */
    double[] fit(double[] shape) {
        double[] field = new double[3 * part.length];
        double translation = 0;
        double rotation = 0;
        for (int i = 0; i < part.length; i++) {
            for (int component = 0; component < 3; component++) {
                field[3 * i + component] = shape[6 * part[i] + component];
                translation = Math.max(translation, Math.abs(field[3 * i + component]));
                rotation = Math.max(rotation, Math.abs(shape[6 * part[i] + 3 + component]));
            }
        }
        if (translation <= ROUND_OFF * size * rotation) {
            return fitSpin(shape, rotation);
        }
        double[] motion = fitTranslations(field, translation);
        if (motion != null && basis.size() < 6) {
            addSpin(motion, shape);
        }
        return motion != null && turnAlike(shape, motion, ROUND_OFF * Math.max(rotation, translation / size)) ? motion : null;
    }

    /** The mean turn about the line of a straight part, which no translation shows. */
    private void addSpin(double[] motion, double[] shape) {
        double[] axis = axis();
        double spin = 0;
        for (int node : part) {
            for (int i = 0; i < 3; i++) {
                spin += axis[i] * (shape[6 * node + 3 + i] - motion[3 + i]) / part.length;
            }
        }
        for (int i = 0; i < 3; i++) {
            motion[3 + i] += spin * axis[i];
        }
    }

    private double[] axis() {
        double[] longest = new double[3];
        for (int node : part) {
            double[] arm = arm(node);
            longest = dot(arm, arm) > dot(longest, longest) ? arm : longest;
        }
        double length = norm(longest);
        scale(longest, length > 0 ? 1 / length : 0);
        return longest;
    }

    private boolean turnAlike(double[] shape, double[] motion, double tolerance) {
        for (int node : part) {
            for (int component = 3; component < 6; component++) {
                double turned = shape[6 * node + component];
                boolean still = Math.abs(turned) <= tolerance && !held[6 * node + component];
                if (!still && Math.abs(turned - motion[component]) > tolerance) {
                    return false;
                }
            }
        }
        return true;
    }

    private double[] fitTranslations(double[] field, double largest) {
        double[] motion = new double[6];
        double[] rest = field.clone();
        for (int i = 0; i < basis.size(); i++) {
            double along = dot(basis.get(i), field);
            subtract(rest, along, basis.get(i));
            subtract(motion, -along, coefficients.get(i));
        }
        for (int component = 3; component < 6; component++) {
            motion[component] /= size;
        }
        return NullSpace.largest(rest) <= ROUND_OFF * largest ? motion : null;
    }

    private double[] fitSpin(double[] shape, double largest) {
        double[] motion = new double[6];
        for (int component = 3; component < 6; component++) {
            motion[component] = shape[6 * part[0] + component];
            for (int node : part) {
                if (Math.abs(shape[6 * node + component] - motion[component]) > ROUND_OFF * largest) {
                    return null;
                }
            }
        }
        return motion;
    }

    /**
     * The directions that rigid motions span: rotations, and the translations that are possible without rotation.
     */
    boolean[] directions(List<double[]> motions) {
        List<double[]> rows = new ArrayList<>();
        for (double[] motion : motions) {
            rows.add(new double[] {size * motion[3], size * motion[4], size * motion[5], motion[0], motion[1], motion[2]});
        }
        boolean[] directions = new boolean[6];
        for (double[] row : echelon(rows)) {
            double largest = NullSpace.largest(row);
            boolean turns = Math.max(Math.abs(row[0]), Math.max(Math.abs(row[1]), Math.abs(row[2]))) > 1e-3 * largest;
            for (int i = 0; i < 3; i++) {
                directions[3 + i] |= turns && Math.abs(row[i]) > 0.05 * largest;
                directions[i] |= !turns && Math.abs(row[3 + i]) > 0.05 * largest;
            }
        }
        return directions;
    }

    /** Row echelon form, rotations first, so that rows without rotation remain where translations are possible alone. */
    private static List<double[]> echelon(List<double[]> rows) {
        int done = 0;
        for (int column = 0; column < 6 && done < rows.size(); column++) {
            int best = done;
            for (int i = done + 1; i < rows.size(); i++) {
                best = Math.abs(rows.get(i)[column]) > Math.abs(rows.get(best)[column]) ? i : best;
            }
            double pivot = rows.get(best)[column];
            if (Math.abs(pivot) <= ROUND_OFF * NullSpace.largest(rows.get(best))) {
                continue;
            }
            double[] row = rows.set(best, rows.get(done));
            rows.set(done, row);
            for (int i = 0; i < rows.size(); i++) {
                if (i != done) {
                    subtract(rows.get(i), rows.get(i)[column] / pivot, row);
                }
            }
            done++;
        }
        return rows.subList(0, done);
    }

    private static double dot(double[] a, double[] b) {
        double sum = 0;
        for (int i = 0; i < a.length; i++) {
            sum += a[i] * b[i];
        }
        return sum;
    }

    private static double norm(double[] a) {
        return Math.sqrt(dot(a, a));
    }

    private static void scale(double[] a, double factor) {
        for (int i = 0; i < a.length; i++) {
            a[i] *= factor;
        }
    }

    private static void subtract(double[] a, double factor, double[] b) {
        for (int i = 0; i < a.length; i++) {
            a[i] -= factor * b[i];
        }
    }
}
