package org.modewright.modal;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeSet;
import java.util.stream.IntStream;
import org.modewright.fem.Assembly;
import org.modewright.fem.FrameElement;
import org.modewright.fem.NodePoint;
import org.modewright.fem.SupportCondition;
import org.modewright.modal.Instability.Kind;
import org.modewright.numerics.EigenPairs;

/**
 * Names what makes a structure unstable: motions with the eigenvalue 0 become free parts or mechanisms, negative eigenvalues an
 * indefinite stiffness.
 */
final class InstabilityFinder {

    private static final double MOVES = 1e-3;
    private static final double COUNTS = 0.05;
    private static final double LEADING = 0.8;
    private static final int NAMED_MEMBERS = 5;

    private final Assembly assembly;
    private final EigenPairs pairs;
    private final List<NodePoint> nodes;
    private final Connectivity connectivity;

    InstabilityFinder(Assembly assembly, EigenPairs pairs) {
        this.assembly = assembly;
        this.pairs = pairs;
        nodes = assembly.snapshot().nodes();
        connectivity = Connectivity.of(assembly.snapshot());
    }

    List<Instability> find() {
        List<Instability> found = new ArrayList<>();
        motionsByPart().forEach((part, motions) -> found.addAll(unresisted(part, motions)));
        negative().ifPresent(found::add);
        return found;
    }

    private Map<Integer, List<double[]>> motionsByPart() {
        List<double[]> motions = new ArrayList<>();
        for (int i = 0; i < pairs.count(); i++) {
            if (pairs.values()[i] == 0) {
                motions.add(assembly.expand(pairs.vectors()[i]));
            }
        }
        Map<Integer, List<double[]>> byPart = new LinkedHashMap<>();
        for (double[] motion : NullSpace.reduced(motions)) {
            byPart.computeIfAbsent(connectivity.partOf(mostMoving(motion)), key -> new ArrayList<>()).add(motion);
        }
        return byPart;
    }

    private static int mostMoving(double[] motion) {
        int most = 0;
        for (int i = 1; i < motion.length; i++) {
            if (Math.abs(motion[i]) > Math.abs(motion[most])) {
                most = i;
            }
        }
        return most / 6;
    }

    private List<Instability> unresisted(int part, List<double[]> motions) {
        int[] members = connectivity.parts().get(part);
        RigidMotion rigid = new RigidMotion(members, nodes, held());
        List<double[]> fitted = new ArrayList<>();
        for (double[] motion : motions) {
            double[] fit = rigid.fit(motion);
            if (fit != null) {
                fitted.add(fit);
            }
        }
        if (fitted.size() == motions.size()) {
            return List.of(freePart(part, members, rigid.directions(fitted), motions.size()));
        }
        return connectivity.meetsSupport(part) ? mechanisms(motions) : List.of(looseAndMoving(members, motions.size()));
    }

    private boolean[] held() {
        boolean[] held = new boolean[6 * nodes.size()];
        for (SupportCondition support : assembly.snapshot().supports()) {
            for (int component = 0; component < 6; component++) {
                held[6 * support.node() + component] = support.held()[component];
            }
        }
        return held;
    }

    private Instability freePart(int part, int[] members, boolean[] able, int count) {
        List<String> directions = NodeWords.directions(able);
        String subject = NodeWords.list(members, nodes);
        boolean supported = connectivity.meetsSupport(part);
        String text = supported
                ? subject + (members.length == 1 ? " is" : " are") + " not held enough: the part can move as a rigid body ("
                        + String.join(", ", directions) + "); " + motionsAtZero(count) + "."
                : subject + (members.length == 1 ? " is" : " form a part that is")
                        + " not connected to any support and can move as a rigid body (" + String.join(", ", directions) + "); "
                        + motionsAtZero(count) + ".";
        String remedy = supported ? "Hold the part in these directions, or join it to the structure."
                : "Support the part, join it to the structure, or delete it.";
        return new Instability(Kind.FREE_PART, NodeWords.ids(members, nodes), NodeWords.names(members, nodes), directions, text, remedy);
    }

    private Instability looseAndMoving(int[] members, int count) {
        List<String> directions = NodeWords.directions(new boolean[] {true, true, true, true, true, true});
        String text = NodeWords.list(members, nodes) + " form a part that is not connected to any support and is not rigid in itself; "
                + motionsAtZero(count) + ".";
        return new Instability(Kind.FREE_PART, NodeWords.ids(members, nodes), NodeWords.names(members, nodes), directions, text,
                "Support the part or join it to the structure, then look for releases or missing braces within it.");
    }

    private List<Instability> mechanisms(List<double[]> motions) {
        List<Instability> found = new ArrayList<>();
        for (Group group : Group.of(motions)) {
            int[] moving = group.nodes.stream().mapToInt(Integer::intValue).toArray();
            List<String> directions = NodeWords.directions(group.directions);
            String text = NodeWords.list(moving, nodes) + " can move without resistance (" + String.join(", ", directions) + "); "
                    + motionsAtZero(group.count) + ".";
            found.add(new Instability(Kind.MECHANISM, NodeWords.ids(moving, nodes), NodeWords.names(moving, nodes), directions, text,
                    "Take out a release, add a brace or a support, or give the connection stiffness in these directions."));
        }
        return found;
    }

    private static String motionsAtZero(int count) {
        return Figures.count(count, "mode", "modes") + " at 0 Hz";
    }

    private Optional<Instability> negative() {
        int count = (int) IntStream.range(0, pairs.count()).filter(i -> pairs.values()[i] < 0).count();
        if (count == 0) {
            return Optional.empty();
        }
        double[] shape = assembly.expand(pairs.vectors()[0]);
        List<FrameElement> compressed = compressed(shape);
        Group group = new Group(shape);
        int[] moving = group.nodes.stream().mapToInt(Integer::intValue).toArray();
        List<String> directions = NodeWords.directions(group.directions);
        String cause = compressed.isEmpty() ? "the stiffness itself is negative there, as of a spring with a strong coupling"
                : "the compression in " + NodeWords.members(compressed) + " is more than the structure can carry without buckling";
        String text = "The stiffness is indefinite: " + Figures.count(count, "eigenvalue is", "eigenvalues are") + " negative, the lowest "
                + Figures.significant(pairs.values()[0], 3).replace('-', '\u2212') + " rad²/s²; " + cause + ". "
                + NodeWords.list(moving, nodes) + " would move (" + String.join(", ", directions) + ").";
        return Optional.of(new Instability(Kind.INDEFINITE, NodeWords.ids(moving, nodes), NodeWords.names(moving, nodes),
                directions, compressed.stream().map(FrameElement::id).toList(), text,
                "Check the axial forces and their unit and sign (tension is positive), stiffen the members, or hold these nodes."));
    }

    /** Compressed members that drive the shape out: those that together hold four fifths of its negative energy. */
    private List<FrameElement> compressed(double[] shape) {
        double[] energies = assembly.strainEnergies(shape);
        List<FrameElement> members = assembly.snapshot().members();
        List<Integer> driving = IntStream.range(0, members.size())
                .filter(i -> members.get(i).axialForce() < 0 && energies[i] < 0).boxed()
                .sorted(Comparator.comparingDouble(i -> energies[i])).toList();
        double total = driving.stream().mapToDouble(i -> energies[i]).sum();
        List<FrameElement> leading = new ArrayList<>();
        double sum = 0;
        for (int i : driving) {
            if (sum <= LEADING * total || leading.size() == NAMED_MEMBERS) {
                break;
            }
            leading.add(members.get(i));
            sum += energies[i];
        }
        return leading;
    }

    /** Motions that share nodes, with the nodes and the directions in which they move. */
    private static final class Group {

        private final TreeSet<Integer> nodes = new TreeSet<>();
        private final boolean[] directions = new boolean[6];
        private int count = 1;

        Group(double[] motion) {
            double translation = largest(motion, 0);
            double rotation = largest(motion, 3);
            int first = translation > 1e-9 * rotation ? 0 : 3;
            double scale = first == 0 ? translation : rotation;
            for (int i = 0; i < motion.length; i++) {
                int component = i % 6;
                if (component >= first && component < first + 3) {
                    if (Math.abs(motion[i]) > MOVES * scale) {
                        nodes.add(i / 6);
                    }
                    directions[component] |= Math.abs(motion[i]) > COUNTS * scale;
                }
            }
        }

        static List<Group> of(List<double[]> motions) {
            List<Group> groups = new ArrayList<>();
            for (double[] motion : motions) {
                Group merged = new Group(motion);
                for (Group other : List.copyOf(groups)) {
                    if (other.nodes.stream().anyMatch(merged.nodes::contains)) {
                        merged.take(other);
                        groups.remove(other);
                    }
                }
                groups.add(merged);
            }
            return groups;
        }

        private void take(Group other) {
            nodes.addAll(other.nodes);
            count += other.count;
            for (int i = 0; i < 6; i++) {
                directions[i] |= other.directions[i];
            }
        }

        private static double largest(double[] motion, int first) {
            double largest = 0;
            for (int i = 0; i < motion.length; i++) {
                if (i % 6 >= first && i % 6 < first + 3) {
                    largest = Math.max(largest, Math.abs(motion[i]));
                }
            }
            return largest;
        }
    }
}
