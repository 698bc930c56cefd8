package org.modewright.numerics;

/**
 * Stiffness and consistent mass of a frame building of Euler-Bernoulli members (stiffness and mass matrices of J. S. Przemieniecki,
 * Theory of Matrix Structural Analysis, McGraw-Hill 1968, chapters 5 and 11): storeys of equal height on a grid of equal bays, every
 * member split in equal elements, held at its feet. SI units.
 */
final class FrameBuilding {

    private static final double YOUNG = 30e9;
    private static final double SHEAR = 12.5e9;
    private static final double DENSITY = 2500.0;
    private static final double STOREY = 3.2;
    private static final double[] COLUMN = {0.25, 5.2e-3, 5.2e-3, 8.8e-3};
    private static final double[] BEAM = {0.18, 5.4e-3, 1.35e-3, 3.0e-3};

    private final int nx;
    private final int ny;
    private final int elements;
    private final double bayX;
    private final double bayY;
    private int nodes;
    private final SymmetricMatrix.Builder k;
    private final SymmetricMatrix.Builder m;
    private final boolean held;

    private FrameBuilding(int nx, int ny, int storeys, int elements, double bayX, double bayY, boolean held) {
        this.nx = nx;
        this.ny = ny;
        this.elements = elements;
        this.bayX = bayX;
        this.bayY = bayY;
        this.held = held;
        int members = storeys * (nx * ny + (nx - 1) * ny + nx * (ny - 1));
        nodes = (storeys + (held ? 0 : 1)) * nx * ny;
        int order = 6 * (nodes + members * (elements - 1));
        k = SymmetricMatrix.builder(order);
        m = SymmetricMatrix.builder(order);
        for (int storey = 1; storey <= storeys; storey++) {
            addStorey(storey);
        }
    }

    /** A building held at its feet. */
    static EigenProblem problem(int nx, int ny, int storeys, int elementsPerMember, double bayX, double bayY) {
        FrameBuilding building = new FrameBuilding(nx, ny, storeys, elementsPerMember, bayX, bayY, true);
        return new EigenProblem(building.k.build(), building.m.build());
    }

    /** A building that floats, with six rigid-body motions. */
    static EigenProblem floating(int nx, int ny, int storeys, int elementsPerMember) {
        FrameBuilding building = new FrameBuilding(nx, ny, storeys, elementsPerMember, 6.0, 5.0, false);
        return new EigenProblem(building.k.build(), building.m.build());
    }

    private void addStorey(int storey) {
        for (int y = 0; y < ny; y++) {
            for (int x = 0; x < nx; x++) {
                addMember(joint(x, y, storey - 1), joint(x, y, storey), 2, STOREY, COLUMN);
                if (x + 1 < nx) {
                    addMember(joint(x, y, storey), joint(x + 1, y, storey), 0, bayX, BEAM);
                }
                if (y + 1 < ny) {
                    addMember(joint(x, y, storey), joint(x, y + 1, storey), 1, bayY, BEAM);
                }
            }
        }
    }

    private int joint(int x, int y, int storey) {
        int level = held ? storey - 1 : storey;
        return level < 0 ? -1 : (level * ny + y) * nx + x;
    }

    private void addMember(int start, int end, int axis, double length, double[] section) {
        int from = start;
        for (int e = 0; e < elements; e++) {
            int to = e == elements - 1 ? end : nodes++;
            addElement(from, to, axis, length / elements, section);
            from = to;
        }
    }

    private void addElement(int start, int end, int axis, double length, double[] section) {
        double[][] stiffness = new double[12][12];
        double[][] mass = new double[12][12];
        double lineMass = DENSITY * section[0];
        twoByTwo(stiffness, mass, 0, YOUNG * section[0] / length, lineMass * length);
        twoByTwo(stiffness, mass, 3, SHEAR * section[3] / length, DENSITY * (section[1] + section[2]) * length);
        bending(stiffness, mass, new int[] {1, 5, 7, 11}, YOUNG * section[2], lineMass, length, 1.0);
        bending(stiffness, mass, new int[] {2, 4, 8, 10}, YOUNG * section[1], lineMass, length, -1.0);
        int[] equation = new int[12];
        double[] sign = new double[12];
        int[][] global = {{0, 1, 2}, {1, 0, 2}, {2, 1, 0}};
        double[][] signs = {{1, 1, 1}, {1, -1, 1}, {1, 1, -1}};
        for (int i = 0; i < 12; i++) {
            int node = i < 6 ? start : end;
            equation[i] = node < 0 ? -1 : 6 * node + i % 6 / 3 * 3 + global[axis][i % 3];
            sign[i] = signs[axis][i % 3];
        }
        for (int i = 0; i < 12; i++) {
            for (int j = 0; j <= i; j++) {
                if (equation[i] >= 0 && equation[j] >= 0) {
                    k.add(equation[i], equation[j], sign[i] * sign[j] * stiffness[i][j]);
                    m.add(equation[i], equation[j], sign[i] * sign[j] * mass[i][j]);
                }
            }
        }
    }

    private static void twoByTwo(double[][] stiffness, double[][] mass, int at, double k, double m) {
        stiffness[at][at] = k;
        stiffness[at + 6][at + 6] = k;
        stiffness[at + 6][at] = -k;
        mass[at][at] = m / 3.0;
        mass[at + 6][at + 6] = m / 3.0;
        mass[at + 6][at] = m / 6.0;
    }

    private static void bending(double[][] stiffness, double[][] mass, int[] at, double ei, double lineMass, double l, double s) {
        double[][] k = {{12, 6 * l, -12, 6 * l}, {6 * l, 4 * l * l, -6 * l, 2 * l * l}, {-12, -6 * l, 12, -6 * l},
                {6 * l, 2 * l * l, -6 * l, 4 * l * l}};
        double[][] m = {{156, 22 * l, 54, -13 * l}, {22 * l, 4 * l * l, 13 * l, -3 * l * l}, {54, 13 * l, 156, -22 * l},
                {-13 * l, -3 * l * l, -22 * l, 4 * l * l}};
        for (int i = 0; i < 4; i++) {
            for (int j = 0; j < 4; j++) {
                double sign = (i % 2 == 1 ? s : 1.0) * (j % 2 == 1 ? s : 1.0);
                int row = Math.max(at[i], at[j]);
                int column = Math.min(at[i], at[j]);
                stiffness[row][column] = sign * k[i][j] * ei / (l * l * l);
                mass[row][column] = sign * m[i][j] * lineMass * l / 420.0;
            }
        }
    }
}
