package org.modewright.modal;

import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.TreeSet;
import org.modewright.fem.Assembly;
import org.modewright.fem.FrameElement;
import org.modewright.fem.NodePoint;
import org.modewright.fem.Snapshot;
import org.modewright.fem.SpringElement;
import org.modewright.numerics.EigenPairs;
import org.modewright.numerics.Factorisation;
import org.modewright.numerics.Factorisers;
import org.modewright.numerics.Progress;
import org.modewright.numerics.SymmetricMatrix;

/**
 * Negative stiffness in shapes that carry no mass. It shows in no mode, because such shapes have no finite eigenvalue; the inertia of K
 * alone tells of it: by Sylvester's law K has as many negative pivots as there are negative eigenvalues, finite or not. The factors are
 * made only where compression or coupled springs can make K indefinite.
 */
final class HiddenBuckling {

    private static final int NAMED_MEMBERS = 5;

    private final Assembly assembly;
    private final EigenPairs pairs;

    HiddenBuckling(Assembly assembly, EigenPairs pairs) {
        this.assembly = assembly;
        this.pairs = pairs;
    }

    Optional<Instability> find(Progress progress) {
        boolean anyNegative = pairs.count() > 0 && pairs.values()[0] < 0;
        if (anyNegative || assembly.freeDofs() == 0 || !mayBeIndefinite(assembly.snapshot())) {
            return Optional.empty();
        }
        SymmetricMatrix stiffness = assembly.stiffness();
        try (Factorisation factors = Factorisers.sparse(stiffness, progress).factorise(stiffness, null, 0, progress)) {
            int negative = factors.inertia().negative();
            return negative > 0 ? Optional.of(instability(negative)) : Optional.empty();
        }
    }

    private static boolean mayBeIndefinite(Snapshot snapshot) {
        return snapshot.members().stream().anyMatch(member -> member.axialForce() < 0)
                || snapshot.springs().stream().anyMatch(HiddenBuckling::isCoupled);
    }

    private static boolean isCoupled(SpringElement spring) {
        double[] stiffness = spring.stiffness();
        for (int i = 0; i < stiffness.length; i++) {
            if (i % 7 != 0 && stiffness[i] != 0 || stiffness[i] < 0) {
                return true;
            }
        }
        return false;
    }

    private Instability instability(int negative) {
        List<FrameElement> compressed = assembly.snapshot().members().stream().filter(member -> member.axialForce() < 0)
                .sorted(Comparator.comparingDouble(HiddenBuckling::slenderness).reversed()).limit(NAMED_MEMBERS).toList();
        TreeSet<Integer> ends = new TreeSet<>();
        compressed.forEach(member -> ends.addAll(List.of(member.start(), member.end())));
        int[] nodes = ends.stream().mapToInt(Integer::intValue).toArray();
        List<NodePoint> points = assembly.snapshot().nodes();
        String text = "The stiffness is indefinite in " + Figures.count(negative, "shape", "shapes") + " without mass, which no mode shows"
                + (compressed.isEmpty() ? "; look at the coupled springs." : "; the most compressed for their stiffness are "
                        + NodeWords.members(compressed) + ".");
        return new Instability(Instability.Kind.INDEFINITE, NodeWords.ids(nodes, points), NodeWords.names(nodes, points), List.of(),
                compressed.stream().map(FrameElement::id).toList(), text,
                "Check the axial forces and their unit and sign (tension is positive), stiffen the members, or hold their nodes.");
    }

    /** Compression over the Euler load of the member pinned at both ends. */
    private static double slenderness(FrameElement member) {
        double weakest = Math.min(member.stiffness().bendingY(), member.stiffness().bendingZ());
        return -member.axialForce() * member.length() * member.length() / weakest;
    }
}
