package org.modewright.ui.tests.views;

import java.util.ArrayList;
import java.util.List;
import org.modewright.fem.Carrier;
import org.modewright.fem.Kind;
import org.modewright.fem.MassLedger;
import org.modewright.fem.MassSource;
import org.modewright.fem.NodePoint;
import org.modewright.modal.Certificate;
import org.modewright.modal.Character;
import org.modewright.modal.ModalResult;
import org.modewright.modal.Mode;

/** Results made by hand, small enough to be checked in the head. Two braces, a column and a node with mass carry the energy. */
final class SmallResults {

    static final int BRACE_1 = 0;
    static final int BRACE_2 = 1;
    static final int COLUMN = 2;
    static final int ROOF = 3;

    private static final double[] NOT_MEASURED = new double[6];

    private final ModalResult.Builder builder = ModalResult.builder();
    private final List<Double> frequencies = new ArrayList<>();

    SmallResults() {
        builder.model("by hand", 3, 0, 6);
        builder.nodes(List.of(new NodePoint("n1", "1", 0, 0, 0), new NodePoint("n2", "2", 0, 0, 3)));
        builder.carriers(List.of(carrier(Kind.MEMBER, "m1", "B1", "braces", "level 1"),
                carrier(Kind.MEMBER, "m2", "B2", "braces", "level 1"),
                carrier(Kind.MEMBER, "m3", "C1", "columns", "level 1"), carrier(Kind.NODE, "n2", "2", null, "level 2")));
        builder.mass(new MassLedger(new double[] {4000, 4000, 0}, new double[] {1000, 1000, 5000}, new double[3], new double[3],
                List.of(new MassSource("self", new double[] {1000, 1000, 0}, new double[] {1000, 1000, 2000}),
                        new MassSource("dead", new double[] {3000, 3000, 0}, new double[] {0, 0, 3000})), 0), 0);
        builder.certificate(new Certificate(true, 10, 0, 0, 1e-12, 1e-14), false);
    }

    /** Lets nothing move in Y. */
    SmallResults withoutMassInY() {
        builder.mass(new MassLedger(new double[] {4000, 0, 0}, new double[3], new double[3], new double[3], List.of(), 0), 0);
        return this;
    }

    private static Carrier carrier(Kind kind, String id, String name, String group, String level) {
        return new Carrier(kind, id, name, new int[] {0, 1}, group, null, null, level);
    }

    /** Adds a mode. Shares of effective mass in X and Y; shares of strain and kinetic energy of the four carriers. */
    SmallResults mode(double frequency, Character.Kind kind, double x, double y, double[] strain, double[] kinetic) {
        double omega = 2 * Math.PI * frequency;
        double period = frequency > 0 ? 1 / frequency : Double.POSITIVE_INFINITY;
        frequencies.add(frequency);
        builder.mode(new Mode(frequencies.size(), omega * omega, frequency, period, 1e-12, 1e-13, NOT_MEASURED,
                new double[] {x, y, 0, 0, 0, 0}, 2,
                new double[] {1, 0, 0, 0}, new Character(kind, kind == Character.Kind.LOCAL ? "local: 2 members" : "sway")),
                        new double[12], strain,
                kinetic);
        return this;
    }

    /** Adds a mode that shakes the braces, in which energies matter little to the test. */
    SmallResults mode(double frequency, double x, double y) {
        return mode(frequency, Character.Kind.SWAY_X, x, y, new double[] {0.5, 0.3, 0.2, 0}, new double[] {0.05, 0.05, 0, 0.9});
    }

    ModalResult build() {
        return builder.build();
    }
}
