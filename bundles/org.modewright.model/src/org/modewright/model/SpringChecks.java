package org.modewright.model;

import org.modewright.model.structure.Spring;
import org.modewright.model.structure.SpringCoupling;
import org.modewright.model.structure.StructuralModel;
import org.modewright.model.structure.StructurePackage;

/** Springs that end where they begin, and spring stiffnesses that would give energy away. */
final class SpringChecks {

    /** Round-off allowance of a pivot, relative to the diagonal it came from. */
    private static final double PIVOT_TOLERANCE = 1e-12;

    private final StructuralModel model;
    private final DefectList defects;

    SpringChecks(StructuralModel model, DefectList defects) {
        this.model = model;
        this.defects = defects;
    }

    void run() {
        for (Spring spring : model.getSprings()) {
            if (spring.getNode() != null && spring.getNode() == spring.getTo()) {
                defects.error("spring-to-itself", spring, StructurePackage.Literals.SPRING__TO,
                        ReferenceChecks.sentenceStart(spring) + " starts and ends at the same node.",
                        "Choose another node, or clear 'to' for a spring to ground.");
            }
            checkCouplings(spring);
        }
    }

    private void checkCouplings(Spring spring) {
        for (SpringCoupling coupling : spring.getCouplings()) {
            if (coupling.getFirst() == coupling.getSecond()) {
                defects.error("spring-repeated-coupling-component", coupling, StructurePackage.Literals.SPRING_COUPLING__SECOND,
                        "A coupling of " + Names.describe(spring) + " names " + coupling.getFirst().getLiteral() + " twice.",
                        "Choose two components, or enter the value as the stiffness of that component.");
                return;
            }
        }
        if (!spring.getCouplings().isEmpty() && !isSemidefinite(stiffness(spring))) {
            defects.error("spring-not-semidefinite", spring, StructurePackage.Literals.SPRING__COUPLINGS,
                    "The couplings of " + Names.describe(spring) + " are too large: some motion would have negative strain energy.",
                    "Make each coupling at most the square root of the product of the two stiffnesses that it couples.");
        }
    }

    private static double[][] stiffness(Spring spring) {
        double[] diagonal = {spring.getUx(), spring.getUy(), spring.getUz(), spring.getRx(), spring.getRy(), spring.getRz()};
        double[][] k = new double[6][6];
        for (int i = 0; i < 6; i++) {
            k[i][i] = diagonal[i];
        }
        for (SpringCoupling coupling : spring.getCouplings()) {
            int i = coupling.getFirst().getValue();
            int j = coupling.getSecond().getValue();
            k[i][j] += coupling.getStiffness();
            k[j][i] += coupling.getStiffness();
        }
        return k;
    }

    /**
     * Symmetric elimination on the matrix scaled to a unit diagonal, so that mixed units do not matter: no pivot may be negative, and a
     * vanishing pivot must have a vanishing row. Pivots are taken largest first.
     */
    private static boolean isSemidefinite(double[][] k) {
        double[][] a = scaled(k);
        boolean[] done = new boolean[6];
        for (int step = 0; step < 6; step++) {
            int p = largest(a, done);
            if (a[p][p] <= PIVOT_TOLERANCE) {
                return restVanishes(a, done);
            }
            done[p] = true;
            eliminate(a, done, p);
        }
        return true;
    }

    private static double[][] scaled(double[][] k) {
        double[][] a = new double[6][6];
        for (int i = 0; i < 6; i++) {
            for (int j = 0; j < 6; j++) {
                double scale = Math.sqrt(Math.abs(k[i][i])) * Math.sqrt(Math.abs(k[j][j]));
                a[i][j] = scale > 0 ? k[i][j] / scale : k[i][j];
            }
        }
        return a;
    }

    private static int largest(double[][] a, boolean[] done) {
        int best = -1;
        for (int i = 0; i < 6; i++) {
            if (!done[i] && (best < 0 || a[i][i] > a[best][best])) {
                best = i;
            }
        }
        return best;
    }

    private static boolean restVanishes(double[][] a, boolean[] done) {
        for (int i = 0; i < 6; i++) {
            for (int j = 0; j < 6; j++) {
                if (!done[i] && !done[j] && !(Math.abs(a[i][j]) <= PIVOT_TOLERANCE)) {
                    return false;
                }
            }
        }
        return true;
    }

    private static void eliminate(double[][] a, boolean[] done, int p) {
        for (int i = 0; i < 6; i++) {
            for (int j = 0; j < 6; j++) {
                if (!done[i] && !done[j]) {
                    a[i][j] -= a[i][p] * a[p][j] / a[p][p];
                }
            }
        }
    }
}
