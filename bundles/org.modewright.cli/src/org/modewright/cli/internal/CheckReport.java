package org.modewright.cli.internal;

import java.io.PrintWriter;
import java.util.List;
import java.util.Map;
import java.util.function.Function;
import java.util.stream.Collectors;

import org.modewright.audit.AuditResult;
import org.modewright.audit.AuditStatus;
import org.modewright.audit.Finding;
import org.modewright.audit.Verdict;
import org.modewright.modal.Direction;
import org.modewright.modal.Figures;

/** The result of an audit as a page of plain text, the verdict first. */
final class CheckReport {

    private static final int WIDTH = 110;
    private static final List<Direction> TRANSLATIONS = List.of(Direction.X, Direction.Y, Direction.Z);

    private final PrintWriter out;
    private final Input input;
    private final AuditResult result;
    private final ModalText text;

    CheckReport(PrintWriter out, Input input, AuditResult result) {
        this.out = out;
        this.input = input;
        this.result = result;
        text = new ModalText(out, input.model());
    }

    void print() {
        text.head(input, result.modal());
        out.println();
        out.println(verdict() + "  " + result.summary());
        boolean unstable = result.status() == AuditStatus.UNSTABLE;
        if (unstable) {
            findings();
        } else {
            capture();
        }
        text.certificate(result.modal().certificate());
        text.mass(result.modal().mass());
        text.modes(result.modal());
        text.remarks(result.modal().remarks());
        if (!unstable) {
            findings();
        }
        out.println();
        out.println(Caution.TEXT);
    }

    private String verdict() {
        return switch (result.status()) {
            case PASSED -> "PASSED";
            case NOT_PASSED -> "NOT PASSED";
            case UNSTABLE -> "UNSTABLE";
            case INCOMPLETE -> "INCOMPLETE";
        };
    }

    private void capture() {
        Map<Direction, Verdict> verdicts = result.verdicts().stream().collect(Collectors.toMap(Verdict::direction, Function.identity()));
        out.println();
        String pack = result.verdicts().isEmpty() ? "" : " (rule pack " + result.verdicts().get(0).rulePack() + ")";
        out.println("Mass capture" + pack);
        TextTable table = new TextTable("direction", ">captured", ">required", ">margin", "reached at", "verdict");
        for (Direction direction : TRANSLATIONS) {
            Verdict verdict = verdicts.get(direction);
            String captured = result.modal().hasMass(direction) ? Figures.percent(result.modal().capture(direction)) : "no mass";
            if (verdict == null) {
                table.row(direction.label(), captured, "-", "-", "-", "not judged");
            } else {
                table.row(direction.label(), captured, Figures.percent(verdict.required()), signed(verdict.margin()), reached(verdict),
                        verdict.pass() ? "enough" : "not enough");
            }
        }
        table.print(out);
        result.verdicts().forEach(verdict -> wrap("  ", verdict.text()));
    }

    private static String signed(double share) {
        return (share < 0 ? "" : "+") + Figures.percent(share);
    }

    private static String reached(Verdict verdict) {
        if (verdict.reachedAtMode() > 0) {
            return "mode " + verdict.reachedAtMode();
        }
        return verdict.moreModes() > 0 ? "not; some " + verdict.moreModes() + " modes more" : "not reached";
    }

    private void findings() {
        out.println();
        if (result.findings().isEmpty()) {
            out.println("Findings: none");
            return;
        }
        out.println("Findings (" + result.findings().size() + ")");
        for (Finding finding : result.findings()) {
            wrap("  ", finding.severity().word() + "  " + finding.id() + ": " + finding.text() + " " + finding.remedy());
        }
    }

    private void wrap(String indent, String sentence) {
        StringBuilder line = new StringBuilder(indent);
        for (String word : sentence.split(" ")) {
            if (line.length() > indent.length() && line.length() + word.length() >= WIDTH) {
                out.println(line.toString().stripTrailing());
                line = new StringBuilder(indent).append("  ");
            }
            line.append(word).append(' ');
        }
        out.println(line.toString().stripTrailing());
    }
}
