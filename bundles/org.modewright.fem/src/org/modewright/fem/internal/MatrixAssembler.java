package org.modewright.fem.internal;

import java.util.Arrays;

import org.modewright.numerics.Progress;
import org.modewright.numerics.SymmetricMatrix;

/**
 * Sums T<sup>T</sup>kT and T<sup>T</sup>mT element by element over the free unknowns. An element whose components are all free or held
 * goes in as it is; one with tied components is transformed by its own rows of T. An entry that is nothing but the round-off of terms
 * that cancel is zero: a motion that ties leave to a pin alone has no stiffness, not 1e-16 of its member's.
 */
public final class MatrixAssembler {

    /** What is left of terms that cancel to this share of their sizes is the rounding of an element's own matrix. */
    private static final double ROUND_OFF = 64.0 * Math.ulp(1.0);

    private final Transformation transformation;
    private final SymmetricMatrix.Builder stiffness;
    private final SymmetricMatrix.Builder mass;

    private MatrixAssembler(Transformation transformation) {
        this.transformation = transformation;
        stiffness = SymmetricMatrix.builder(transformation.unknowns());
        mass = SymmetricMatrix.builder(transformation.unknowns());
    }

    static MatrixPair assemble(CarrierStore store, Transformation transformation, Progress progress) {
        MatrixAssembler assembler = new MatrixAssembler(transformation);
        int count = store.carriers().size();
        for (int carrier = 0; carrier < count; carrier++) {
            if (carrier % 1024 == 0) {
                progress.checkCancelled();
                progress.report("Assembling", (double) carrier / count);
            }
            assembler.add(store.places(carrier), store.stiffness(carrier), assembler.stiffness, true);
            assembler.add(store.places(carrier), store.mass(carrier), assembler.mass, false);
        }
        progress.checkCancelled();
        SymmetricMatrix k = assembler.stiffness.build();
        progress.checkCancelled();
        return new MatrixPair(k, assembler.mass.build());
    }

    private void add(int[] places, double[] packed, SymmetricMatrix.Builder builder, boolean keepZeros) {
        if (packed.length == 0) {
            return;
        }
        boolean[] active = active(places.length, packed);
        if (isPlain(places)) {
            addPlain(places, active, packed, builder, keepZeros);
        } else {
            addTransformed(places, active, packed, builder);
        }
    }

    /** Components that an element does anything for. */
    private static boolean[] active(int order, double[] packed) {
        boolean[] active = new boolean[order];
        int place = 0;
        for (int i = 0; i < order; i++) {
            for (int j = 0; j <= i; j++) {
                if (packed[place++] != 0.0) {
                    active[i] = true;
                    active[j] = true;
                }
            }
        }
        return active;
    }

    private boolean isPlain(int[] places) {
        for (int component : places) {
            int from = transformation.rowStart(component);
            int terms = transformation.rowStart(component + 1) - from;
            if (terms > 1 || terms == 1 && transformation.componentOf(transformation.unknownAt(from)) != component) {
                return false;
            }
        }
        return true;
    }

    private void addPlain(int[] places, boolean[] active, double[] packed, SymmetricMatrix.Builder builder, boolean keepZeros) {
        int[] unknowns = new int[places.length];
        Arrays.setAll(unknowns, i -> transformation.isHeld(places[i]) || !active[i]
                ? -1
                : transformation.unknownAt(transformation.rowStart(places[i])));
        int place = 0;
        for (int i = 0; i < places.length; i++) {
            for (int j = 0; j <= i; j++) {
                double value = packed[place++];
                if (unknowns[i] >= 0 && unknowns[j] >= 0 && (keepZeros || value != 0.0)) {
                    builder.add(unknowns[i], unknowns[j], value);
                }
            }
        }
    }

    private void addTransformed(int[] places, boolean[] active, double[] packed, SymmetricMatrix.Builder builder) {
        ElementTransformation own = ElementTransformation.of(transformation, places, active);
        int[] unknowns = own.unknowns();
        int count = unknowns.length;
        double[] product = own.times(packed);
        double[] sizes = own.sizes().times(PackedMatrix.absolute(packed));
        for (int a = 0; a < count; a++) {
            for (int b = 0; b <= a; b++) {
                double value = 0.0;
                double size = 0.0;
                for (int i = 0; i < places.length; i++) {
                    double factor = own.rows()[i * count + a];
                    value += factor * product[i * count + b];
                    size += Math.abs(factor) * sizes[i * count + b];
                }
                if (Math.abs(value) > ROUND_OFF * size) {
                    builder.add(unknowns[a], unknowns[b], value);
                }
            }
        }
    }
}
