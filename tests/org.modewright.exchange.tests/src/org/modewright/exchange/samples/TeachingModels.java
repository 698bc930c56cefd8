package org.modewright.exchange.samples;

import java.util.List;

import org.modewright.model.structure.FrameSection;
import org.modewright.model.structure.Material;
import org.modewright.model.structure.Node;
import org.modewright.model.structure.StructuralModel;

/** The five classical teaching cases, each with a closed-form answer. */
final class TeachingModels {

    /** A density for material whose own mass does not count: the factor of {@code self} is 0. */
    private static final double ANY_DENSITY = 7850;

    private TeachingModels() {
    }

    /** f = sqrt(3EI/(m L^3)) / 2 pi in X and Y, sqrt(EA/(m L)) / 2 pi in Z. */
    static StructuralModel tipMass() {
        ModelBuilder builder = new ModelBuilder("tip-mass", "Massless cantilever with a mass at its tip", "N-m-kg", """
                A round tube of 4 m, clamped at its foot, carries 2000 kg at its tip; its own mass is left out. Sway in X and in Y: \
                f = (1/2π)·√(3EI/(mL³)) = 1.59 Hz; along Z: (1/2π)·√(EA/(mL)) = 47 Hz. One mode in each direction holds \
                all of the mass.""");
        Material steel = builder.material("steel", 210e9, 0.3, ANY_DENSITY);
        FrameSection tube = builder.section("tube", 3.326e-3, 2.0308e-5, 2.0308e-5, 4.0616e-5);
        builder.node("foot", 0, 0, 0);
        builder.node("tip", 0, 0, 4);
        builder.member("cantilever", "foot", "tip", tube, steel, null);
        builder.support("foot", "ux uy uz rx ry rz");
        builder.mass("tip", 2000, 2000, 2000);
        builder.selfMassFactor(0);
        return builder.model();
    }

    /** Two storeys in series: f = sqrt(k1 k2 / ((k1 + k2) m)) / 2 pi, k = 2 * 12 EI / h^3. */
    static StructuralModel twoStoreys() {
        ModelBuilder builder = new ModelBuilder("two-storeys", "Two-storey frame with mass on the top only", "kN-m-t", """
                A shear frame in the plane X-Z: rigid girders, columns without mass, 30 t on the top floor and nothing on the first. \
                The storeys \
                act in series: k = k₁k₂/(k₁+k₂), f = (1/2π)·√(k/m), with 24EI/h³ a storey. The first floor moves without mass of its \
                own: \
                one mode holds all of the mass.""");
        Material concrete = builder.material("concrete", 30e6, 0.2, 2.5);
        FrameSection column = builder.section("column 40x40", 0.16, 2.1333333333333333e-3, 2.1333333333333333e-3, 3.6e-3);
        storeys(builder, new double[] {4, 3}, concrete, new FrameSection[] {column, column}, new double[] {0, 30});
        return builder.model();
    }

    /** Flexibility x_i^2 (3 x_j - x_i) / (6 EI), x_i not above x_j. */
    static StructuralModel cantilever() {
        ModelBuilder builder = new ModelBuilder("cantilever", "Cantilever with three masses", "kN-m-t", """
                A chimney-like cantilever of 30 m with 12, 9 and 6 t at 10, 20 and 30 m; its own mass is left out. The flexibility \
                under a unit \
                force at x_j is x_i²(3x_j − x_i)/(6EI) at x_i ≤ x_j; the eigenvalues of flexibility times mass are 1/ω². Three modes in \
                each direction hold all of the mass; the first holds 68 %.""");
        Material steel = builder.material("steel", 210e6, 0.3, 7.85);
        FrameSection shell = builder.section("shell", 0.0628, 7.8e-3, 7.8e-3, 15.6e-3);
        builder.node("0", 0, 0, 0);
        builder.support("0", "ux uy uz rx ry rz");
        double[] masses = {12, 9, 6};
        for (int i = 1; i <= masses.length; i++) {
            builder.node(String.valueOf(i), 0, 0, 10 * i);
            builder.member("part " + i, String.valueOf(i - 1), String.valueOf(i), shell, steel, null);
            builder.mass(String.valueOf(i), masses[i - 1], masses[i - 1], masses[i - 1]);
        }
        builder.selfMassFactor(0);
        return builder.model();
    }

    /** Shear frame with m = 2, 1.5, 1 kip s2/in and k = 180, 120, 60 kip/in from the bottom. */
    static StructuralModel threeStoreys() {
        ModelBuilder builder = new ModelBuilder("three-storeys", "Three-storey frame", "kip-in", """
                A shear frame in the plane X-Z with storey stiffnesses 180, 120 and 60 kip/in and masses 2.0, 1.5 and 1.0 kip·s²/in \
                from the \
                bottom to the top: periods 1.368, 0.640 and 0.431 s. The first mode holds 81 % of the mass, the first two 96 %.""");
        Material steel = builder.material("steel", 29000, 0.3, 7.35e-7);
        double[] stiffness = {180, 120, 60};
        double height = 144;
        FrameSection[] columns = new FrameSection[stiffness.length];
        for (int i = 0; i < columns.length; i++) {
            // two columns a storey: k = 24 EI / h^3
            double second = stiffness[i] * height * height * height / (24 * 29000);
            columns[i] = builder.section("column " + (i + 1), 20, second, second, second);
        }
        storeys(builder, new double[] {height, height, height}, steel, columns, new double[] {2, 1.5, 1});
        return builder.model();
    }

    /** Uniform chain: omega_n = 2 sqrt(k/m) sin((2n - 1) pi / (2 (2N + 1))). */
    static StructuralModel massChain() {
        ModelBuilder builder = new ModelBuilder("mass-chain", "Masses in series on springs", "N-m-kg", """
                Five masses of 100 kg in a row, each held to the one before by a spring of 40,000 N/m, the first to ground: \
                ωₙ = 2√(k/m)·sin((2n−1)π/22). The first mode holds 87.95 % of the mass, the first two 96.67 %: 90 % needs two.""");
        builder.judge(true, false, false);
        for (int i = 1; i <= 5; i++) {
            builder.node(String.valueOf(i), i, 0, 0);
            builder.mass(String.valueOf(i), 100, 0, 0);
            builder.spring("spring " + i, String.valueOf(i), i == 1 ? null : String.valueOf(i - 1), 40_000);
        }
        return builder.model();
    }

    /** Two lines of columns whose nodes only move in X, the two of a floor together; half of the floor's mass at each. */
    private static void storeys(ModelBuilder builder, double[] heights, Material material, FrameSection[] columns, double[] masses) {
        builder.judge(true, false, false);
        builder.selfMassFactor(0);
        double width = heights[0] * 1.5;
        ground(builder, width);
        double z = 0;
        for (int floor = 1; floor <= heights.length; floor++) {
            z += heights[floor - 1];
            builder.level("floor " + floor, z);
            Node left = builder.node("L" + floor, 0, 0, z);
            Node right = builder.node("R" + floor, width, 0, z);
            for (String side : List.of("L", "R")) {
                builder.member("column " + side + floor, side + (floor - 1), side + floor, columns[floor - 1], material, "columns");
                builder.support(side + floor, "uy uz rx ry rz");
                if (masses[floor - 1] > 0) {
                    builder.mass(side + floor, masses[floor - 1] / 2, 0, 0);
                }
            }
            builder.floor("floor " + floor, List.of(left, right));
        }
    }

    private static void ground(ModelBuilder builder, double width) {
        builder.node("L0", 0, 0, 0);
        builder.node("R0", width, 0, 0);
        builder.support("L0", "ux uy uz rx ry rz");
        builder.support("R0", "ux uy uz rx ry rz");
    }
}
