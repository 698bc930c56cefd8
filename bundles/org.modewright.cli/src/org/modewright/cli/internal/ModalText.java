package org.modewright.cli.internal;

import java.io.PrintWriter;
import java.util.List;

import org.modewright.fem.MassLedger;
import org.modewright.fem.MassSource;
import org.modewright.modal.Certificate;
import org.modewright.modal.Direction;
import org.modewright.modal.Figures;
import org.modewright.modal.ModalResult;
import org.modewright.modal.Mode;
import org.modewright.model.Quantity;
import org.modewright.model.Units;
import org.modewright.model.structure.StructuralModel;

/** The parts of a report that every run has. */
final class ModalText {

    private static final int FIRST_MODES = 15;
    private static final int FIGURES = 4;

    private final PrintWriter out;
    private final StructuralModel model;

    ModalText(PrintWriter out, StructuralModel model) {
        this.out = out;
        this.model = model;
    }

    void head(Input input, ModalResult result) {
        String title = model.getTitle() == null || model.getTitle().isBlank() ? model.getName() : model.getTitle();
        out.println(title + "  (" + input.file() + ")");
        out.println(Figures.count(result.nodeCount(), "node", "nodes") + ", " + Figures.count(result.memberCount(), "member", "members")
                + ", " + result.freeDofs() + " free degrees of freedom; units " + model.getUnits().getLiteral());
    }

    void certificate(Certificate certificate) {
        out.println();
        out.println("Certificate  " + certificate.line());
    }

    /** Masses in the units of the model. */
    void mass(MassLedger ledger) {
        Units units = Units.of(model);
        out.println();
        out.println("Mass (" + units.symbol(Quantity.MASS) + ")");
        TextTable table = new TextTable("", ">X", ">Y", ">Z");
        row(table, "movable", ledger.movable(), units.mass());
        for (MassSource source : ledger.sources()) {
            row(table, "  " + sourceName(source.name()), source.movable(), units.mass());
        }
        row(table, "on supports", ledger.onSupports(), units.mass());
        table.print(out);
        double[] centre = ledger.centre();
        out.println("  centre of the movable mass: " + length(centre[0], units) + ", " + length(centre[1], units) + ", "
                + length(centre[2], units) + " " + units.symbol(Quantity.LENGTH));
    }

    private static String sourceName(String name) {
        return name.equals("self") ? "own mass of the elements" : name;
    }

    private static void row(TextTable table, String name, double[] kilograms, double unit) {
        table.row(name, mass(kilograms[0], unit), mass(kilograms[1], unit), mass(kilograms[2], unit));
    }

    private static String mass(double kilograms, double unit) {
        return Figures.significant(kilograms / unit, FIGURES);
    }

    private static String length(double metres, Units units) {
        return Figures.significant(metres / units.length(), FIGURES);
    }

    /** The first modes. */
    void modes(ModalResult result) {
        modes(result, FIRST_MODES);
    }

    /** Every mode. */
    void allModes(ModalResult result) {
        modes(result, Integer.MAX_VALUE);
    }

    private void modes(ModalResult result, int most) {
        int shown = Math.min(most, result.modes().size());
        out.println();
        if (shown == 0) {
            out.println("Modes: none");
            return;
        }
        out.println(shown < result.modes().size() ? "Modes (the first " + shown + " of " + result.modes().size() + ")"
                : "Modes (" + shown + ")");
        TextTable table = new TextTable(">mode", ">period (s)", ">frequency (Hz)", ">X", ">Y", ">Z", ">sum X", ">sum Y", ">sum Z",
                "character");
        double[] x = result.running(Direction.X);
        double[] y = result.running(Direction.Y);
        double[] z = result.running(Direction.Z);
        for (int i = 0; i < shown; i++) {
            Mode mode = result.modes().get(i);
            table.row(String.valueOf(mode.number()), period(mode.period()), Figures.significant(mode.frequency(), FIGURES),
                    share(mode, Direction.X), share(mode, Direction.Y), share(mode, Direction.Z), Figures.percent(x[i]),
                    Figures.percent(y[i]), Figures.percent(z[i]), mode.character().text());
        }
        table.print(out);
    }

    static String period(double seconds) {
        return Double.isFinite(seconds) ? Figures.significant(seconds, FIGURES) : "-";
    }

    private static String share(Mode mode, Direction direction) {
        return Figures.percent(mode.effectiveMassShare(direction));
    }

    void remarks(List<String> remarks) {
        if (!remarks.isEmpty()) {
            out.println();
            remarks.forEach(out::println);
        }
    }
}
