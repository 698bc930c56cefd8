package org.modewright.cli.internal;

import java.io.PrintWriter;

import org.modewright.modal.Figures;
import org.modewright.modal.Instability;
import org.modewright.modal.MatrixRun;
import org.modewright.modal.ModalResult;

/** Modes and certificate as plain text. */
final class SolveReport {

    private static final int FIGURES = 7;

    private final PrintWriter out;

    SolveReport(PrintWriter out) {
        this.out = out;
    }

    void print(Input input, ModalResult result) {
        ModalText text = new ModalText(out, input.model());
        text.head(input, result);
        text.certificate(result.certificate());
        for (Instability instability : result.instabilities()) {
            out.println("  " + instability.text());
        }
        text.mass(result.mass());
        text.allModes(result);
        text.remarks(result.remarks());
        out.println();
        out.println(Caution.TEXT);
    }

    void print(MatrixRun.Result result) {
        out.println("Pair of matrices of order " + result.order());
        new ModalText(out, null).certificate(result.certificate());
        out.println();
        TextTable table = new TextTable(">mode", ">eigenvalue", ">frequency (Hz)", ">period (s)", ">residual");
        double[] frequencies = result.frequencies();
        for (int i = 0; i < frequencies.length; i++) {
            table.row(String.valueOf(i + 1), Figures.significant(result.pairs().values()[i], FIGURES),
                    Figures.significant(frequencies[i], FIGURES), ModalText.period(1 / frequencies[i]),
                    Figures.scientific(result.pairs().residuals()[i]));
        }
        table.print(out);
        new ModalText(out, null).remarks(result.remarks());
    }
}
