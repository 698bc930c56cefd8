package org.modewright.render;

/**
 * The displacement of every vertex of a scene in one shape, computed once and then drawn at any amplitude as position + factor ×
 * displacement.
 *
 * <p>A member between its ends i and j of length L with unit axis e follows the cubic Hermite shape functions of the Euler–Bernoulli beam
 * (Przemieniecki, Theory of Matrix Structural Analysis, 1968, ch. 5; from memory): with ξ = 0…1, u⊥ the part of an end displacement
 * square to e and θ the end rotations,
 * <pre>
 * d(ξ) = e ((1 - ξ) e·u_i + ξ e·u_j) + N1 u⊥_i + L N2 θ_i × e + N3 u⊥_j + L N4 θ_j × e
 * N1 = 1 - 3ξ² + 2ξ³, N2 = ξ - 2ξ² + ξ³, N3 = 3ξ² - 2ξ³, N4 = -ξ² + ξ³
 * </pre>
 * and twists by (1 - ξ) e·θ_i + ξ e·θ_j. Rotations are radians of the linear theory, all components global.
 */
public final class Deformation {

    private final Scene scene;
    private final float[] displacement;
    private final float[] twist;

    /** A deformation of zero; give vertices and members their displacements next. */
    public Deformation(Scene scene) {
        this.scene = scene;
        displacement = new float[3 * scene.vertexCount()];
        twist = new float[scene.vertexCount()];
    }

    /** Displaces one vertex (of a marker, label or triangle). */
    public void vertex(int vertex, double ux, double uy, double uz) {
        displacement[3 * vertex] = (float) ux;
        displacement[3 * vertex + 1] = (float) uy;
        displacement[3 * vertex + 2] = (float) uz;
    }

    /**
     * Bends a member.
     *
     * @param ends u_x, u_y, u_z, θ_x, θ_y, θ_z of the start, then of the end, global components; where an end is released give the
     * rotation of the
     *     member's own end
     */
    public void member(int member, double[] ends) {
        displace(member, ends, true);
    }

    /** Moves a member that stays straight, such as an axial-only bar; the rotations are ignored. */
    public void memberStraight(int member, double[] ends) {
        displace(member, ends, false);
    }

    private void displace(int member, double[] ends, boolean bent) {
        int first = scene.firstVertex(member);
        int count = scene.segments(member);
        double[] start = scene.vertex(first);
        double[] end = scene.vertex(first + count);
        double[] shift = new double[3];
        for (int i = 0; i <= count; i++) {
            double xi = i / (double) count;
            if (bent) {
                curve(start, end, ends, xi, shift);
                twist[first + i] = (float) twist(start, end, ends, xi);
            } else {
                for (int k = 0; k < 3; k++) {
                    shift[k] = (1 - xi) * ends[k] + xi * ends[6 + k];
                }
            }
            vertex(first + i, shift[0], shift[1], shift[2]);
        }
    }

    /**
     * The displacement at ξ of the way along a member, see the class comment.
     *
     * @param start x, y, z of the member's start
     * @param end   x, y, z of its end; a member without length moves linearly between its ends
     * @param ends  twelve end displacements and rotations, global
     * @param xi    0 at the start, 1 at the end
     * @param out   receives u_x, u_y, u_z
     */
    public static void curve(double[] start, double[] end, double[] ends, double xi, double[] out) {
        double lx = end[0] - start[0];
        double ly = end[1] - start[1];
        double lz = end[2] - start[2];
        double square = lx * lx + ly * ly + lz * lz;
        double inverse = square > 0 ? 1 / square : 0;
        double axialStart = (ends[0] * lx + ends[1] * ly + ends[2] * lz) * inverse;
        double axialEnd = (ends[6] * lx + ends[7] * ly + ends[8] * lz) * inverse;
        double n3 = xi * xi * (3 - 2 * xi);
        double n1 = 1 - n3;
        double n2 = xi * (1 - xi) * (1 - xi);
        double n4 = -xi * xi * (1 - xi);
        double axial = (1 - xi - n1) * axialStart + (xi - n3) * axialEnd;
        double rx = n2 * ends[3] + n4 * ends[9];
        double ry = n2 * ends[4] + n4 * ends[10];
        double rz = n2 * ends[5] + n4 * ends[11];
        out[0] = n1 * ends[0] + n3 * ends[6] + axial * lx + ry * lz - rz * ly;
        out[1] = n1 * ends[1] + n3 * ends[7] + axial * ly + rz * lx - rx * lz;
        out[2] = n1 * ends[2] + n3 * ends[8] + axial * lz + rx * ly - ry * lx;
    }

    private static double twist(double[] start, double[] end, double[] ends, double xi) {
        double sum = 0;
        double square = 0;
        for (int k = 0; k < 3; k++) {
            double l = end[k] - start[k];
            sum += l * ((1 - xi) * ends[3 + k] + xi * ends[9 + k]);
            square += l * l;
        }
        return square > 0 ? sum / Math.sqrt(square) : 0;
    }

    /** The largest displacement of any vertex. */
    public double largest() {
        double square = 0;
        for (int i = 0; i < displacement.length; i += 3) {
            double x = displacement[i];
            double y = displacement[i + 1];
            double z = displacement[i + 2];
            square = Math.max(square, x * x + y * y + z * z);
        }
        return Math.sqrt(square);
    }

    /** The displacement of a vertex, x, y, z. */
    public double[] at(int vertex) {
        return new double[] {displacement[3 * vertex], displacement[3 * vertex + 1], displacement[3 * vertex + 2]};
    }

    Scene scene() {
        return scene;
    }

    float[] displacement() {
        return displacement;
    }

    float[] twist() {
        return twist;
    }
}
