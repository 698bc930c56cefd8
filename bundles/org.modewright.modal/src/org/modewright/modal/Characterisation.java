package org.modewright.modal;

import java.util.Locale;
import org.modewright.modal.Character.Kind;

/**
 * Puts a mode into words by {@link CharacterRules}. In this order: a motion without resistance, one driven out, a local mode; then sway,
 * torsion or vertical motion by which holds the leading share of the kinetic energy; else mixed.
 */
final class Characterisation {

    private final CharacterRules rules;
    private final int nodeCount;
    private final StoreyMotion storeys;

    Characterisation(CharacterRules rules, int nodeCount, StoreyMotion storeys) {
        this.rules = rules;
        this.nodeCount = nodeCount;
        this.storeys = storeys;
    }

    /** What is known of a mode before it has a character. */
    record Figure(double eigenvalue, double[] effectiveMassShare, double spread, double[] split, double spinEnergy) {
    }

    Character of(Figure mode, double[] shape, LocalWords local) {
        if (mode.eigenvalue() < 0) {
            return new Character(Kind.UNSTABLE, "driven out by compression");
        }
        if (mode.eigenvalue() == 0) {
            return new Character(Kind.RIGID, "motion without resistance");
        }
        if (isLocal(mode)) {
            return new Character(Kind.LOCAL, "local: " + local.text());
        }
        StoreyMotion.Energies energies = storeys.of(shape);
        return global(energies, energies.twist() + mode.spinEnergy(), mode.split());
    }

    private boolean isLocal(Figure mode) {
        double[] share = mode.effectiveMassShare();
        double largest = Math.max(share[0], Math.max(share[1], share[2]));
        return mode.spread() < rules.localNodes() * nodeCount && largest <= rules.localMass();
    }

    private Character global(StoreyMotion.Energies energies, double twist, double[] split) {
        double sway = energies.sway();
        if (split[2] >= rules.leading()) {
            return new Character(Kind.VERTICAL, "vertical");
        }
        if (Math.max(sway, twist) < rules.accompanying() || sway + twist < rules.leading()) {
            return mixed(split);
        }
        return sway >= twist ? swaying(energies, twist) : twisting(energies);
    }

    private Character swaying(StoreyMotion.Energies energies, double twist) {
        String text = "sway " + direction(energies);
        if (twist >= rules.accompanying()) {
            return new Character(Kind.SWAY_WITH_TORSION, text + " with torsion");
        }
        if (energies.x() >= rules.straight() * energies.sway()) {
            return new Character(Kind.SWAY_X, text);
        }
        return new Character(energies.y() >= rules.straight() * energies.sway() ? Kind.SWAY_Y : Kind.SWAY, text);
    }

    private Character twisting(StoreyMotion.Energies energies) {
        boolean accompanied = energies.sway() >= rules.accompanying();
        return new Character(Kind.TORSION, accompanied ? "torsion with sway " + direction(energies) : "torsion");
    }

    /** The principal plan direction of the mean motions, by their second moments. */
    private String direction(StoreyMotion.Energies energies) {
        double sway = energies.sway();
        if (energies.x() >= rules.straight() * sway) {
            return "X";
        }
        if (energies.y() >= rules.straight() * sway) {
            return "Y";
        }
        double difference = energies.x() - energies.y();
        double principal = (sway + Math.hypot(difference, 2 * energies.xy())) / 2;
        if (principal < rules.straight() * sway) {
            return "X and Y";
        }
        double degrees = Math.toDegrees(0.5 * Math.atan2(2 * energies.xy(), difference));
        return String.format(Locale.ROOT, "at %.0f° to X", degrees).replace('-', '\u2212');
    }

    private Character mixed(double[] split) {
        if (split[0] + split[1] >= rules.straight()) {
            String direction = split[0] >= rules.straight() ? "X" : split[1] >= rules.straight() ? "Y" : "X and Y";
            return new Character(Kind.MIXED, "in " + direction + ", parts against each other");
        }
        String[] names = {"X", "Y", "Z", "rotation"};
        StringBuilder text = new StringBuilder();
        for (int i = 0; i < names.length; i++) {
            if (split[i] >= 0.1) {
                text.append(text.length() == 0 ? "" : ", ").append(String.format(Locale.ROOT, "%.0f %% %s", 100 * split[i], names[i]));
            }
        }
        return new Character(Kind.MIXED, "mixed: " + text);
    }

    /** Words for where a local mode is, found only when they are needed. */
    interface LocalWords {
        String text();
    }
}
