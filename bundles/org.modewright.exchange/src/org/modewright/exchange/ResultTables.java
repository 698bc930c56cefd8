package org.modewright.exchange;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.function.Function;
import java.util.stream.Collectors;

import org.modewright.audit.AuditResult;
import org.modewright.audit.Finding;
import org.modewright.audit.ObjectRef;
import org.modewright.audit.Verdict;
import org.modewright.exchange.internal.AtomicOutput;
import org.modewright.exchange.internal.ResultWriter;
import org.modewright.exchange.internal.tables.TableText;
import org.modewright.fem.MassLedger;
import org.modewright.fem.MassSource;
import org.modewright.modal.Direction;
import org.modewright.modal.Dominance;
import org.modewright.modal.MatrixRun;
import org.modewright.modal.ModalResult;
import org.modewright.modal.Mode;

/**
 * Results as CSV tables for spreadsheets: UTF-8, decimal point, units in the headers, SI, numbers in full double precision, text that a
 * spreadsheet might run escaped as {@link SpreadsheetText} says.
 */
public final class ResultTables {

    private static final List<Direction> TRANSLATIONS = List.of(Direction.X, Direction.Y, Direction.Z);

    private ResultTables() {
    }

    /**
     * Writes {@code modes.csv}, {@code energy.csv}, {@code groups.csv}, {@code levels.csv}, {@code mass.csv}, {@code verdicts.csv} and
     * {@code findings.csv}.
     *
     * @param folder made where it is missing
     * @param allElements whether {@code energy.csv} holds all elements, not only the leading ones of each mode
     */
    public static void write(AuditResult result, Path folder, boolean allElements) throws IOException {
        Map<String, TableText> tables = modal(result.modal(), allElements);
        tables.put("verdicts.csv", verdicts(result.verdicts()));
        tables.put("findings.csv", findings(result.findings()));
        write(tables, folder);
    }

    /** Writes the leading elements of each mode, and else as {@link #write(AuditResult, Path, boolean)}. */
    public static void write(AuditResult result, Path folder) throws IOException {
        write(result, folder, false);
    }

    /** Writes the tables of modes, energies and masses. */
    public static void write(ModalResult result, Path folder, boolean allElements) throws IOException {
        write(modal(result, allElements), folder);
    }

    /** Writes {@code modes.csv} of a pair of matrices. */
    public static void write(MatrixRun.Result result, Path folder) throws IOException {
        TableText table = new TableText(List.of("mode", "frequency (Hz)", "period (s)", "residual", "error bound"));
        double[] frequencies = result.frequencies();
        for (int i = 0; i < frequencies.length; i++) {
            table.number(i + 1).number(frequencies[i]).number(1 / frequencies[i]).number(result.pairs().residuals()[i])
                    .number(result.pairs().errorBounds()[i]).end();
        }
        write(Map.of("modes.csv", table), folder);
    }

    private static void write(Map<String, TableText> tables, Path folder) throws IOException {
        Files.createDirectories(folder);
        for (Map.Entry<String, TableText> table : tables.entrySet()) {
            AtomicOutput.write(folder.resolve(table.getKey()), table.getValue().bytes());
        }
    }

    private static Map<String, TableText> modal(ModalResult result, boolean allElements) {
        Map<String, TableText> tables = new LinkedHashMap<>();
        tables.put("modes.csv", modes(result));
        tables.put("energy.csv", energy(result, allElements));
        tables.put("groups.csv", sums(result, "group", Dominance.RollUp.GROUP));
        tables.put("levels.csv", sums(result, "level", Dominance.RollUp.LEVEL));
        tables.put("mass.csv", mass(result.mass()));
        return tables;
    }

    private static TableText modes(ModalResult result) {
        List<String> columns = new ArrayList<>(List.of("mode", "frequency (Hz)", "period (s)", "residual", "error bound"));
        addColumns(columns, "participation ", direction -> direction.isTranslation() ? " (kg^0.5)" : " (kg^0.5 m)", Direction.values());
        addColumns(columns, "effective mass share ", direction -> "", Direction.values());
        addColumns(columns, "captured up to here ", direction -> "", Direction.X, Direction.Y, Direction.Z);
        columns.addAll(List.of("spread (nodes)", "character"));
        TableText table = new TableText(columns);
        Map<Direction, double[]> running = TRANSLATIONS.stream().collect(Collectors.toMap(Function.identity(), result::running));
        for (int i = 0; i < result.modes().size(); i++) {
            Mode mode = result.modes().get(i);
            table.number(mode.number()).number(mode.frequency()).number(mode.period()).number(mode.residual()).number(mode.errorBound());
            addNumbers(table, mode.participation());
            addNumbers(table, mode.effectiveMassShare());
            for (Direction direction : TRANSLATIONS) {
                table.number(running.get(direction)[i]);
            }
            table.number(mode.spread()).text(mode.character().text()).end();
        }
        return table;
    }

    private static void addColumns(List<String> columns, String before, Function<Direction, String> unit, Direction... directions) {
        for (Direction direction : directions) {
            columns.add(before + direction.word() + unit.apply(direction));
        }
    }

    private static void addNumbers(TableText table, double[] values) {
        for (double value : values) {
            table.number(value);
        }
    }

    private static TableText energy(ModalResult result, boolean allElements) {
        TableText table = new TableText(List.of("mode", "energy", "rank", "kind", "element", "group", "level", "share", "running share"));
        Dominance dominance = new Dominance(result);
        for (int mode = 0; mode < result.modes().size(); mode++) {
            for (Dominance.Energy energy : Dominance.Energy.values()) {
                List<Dominance.Share> shares = allElements ? dominance.ranked(mode, energy, Dominance.RollUp.ELEMENT)
                        : dominance.leading(mode, energy, ResultWriter.LEADING_SHARE, ResultWriter.MOST_LEADING);
                int rank = 1;
                for (Dominance.Share share : shares) {
                    table.number(result.modes().get(mode).number()).text(word(energy)).number(rank++).text(share.kind().word())
                            .text(share.label()).text(result.carriers().get(share.carrier()).group())
                            .text(result.carriers().get(share.carrier()).level()).number(share.share()).number(share.running()).end();
                }
            }
        }
        return table;
    }

    private static TableText sums(ModalResult result, String what, Dominance.RollUp by) {
        TableText table = new TableText(List.of("mode", "energy", what, "share"));
        Dominance dominance = new Dominance(result);
        for (int mode = 0; mode < result.modes().size(); mode++) {
            for (Dominance.Energy energy : Dominance.Energy.values()) {
                for (Dominance.Share share : dominance.ranked(mode, energy, by)) {
                    table.number(result.modes().get(mode).number()).text(word(energy)).text(share.label()).number(share.share()).end();
                }
            }
        }
        return table;
    }

    private static String word(Dominance.Energy energy) {
        return energy == Dominance.Energy.STRAIN ? "strain" : "kinetic";
    }

    private static TableText mass(MassLedger ledger) {
        TableText table = new TableText(List.of("origin", "direction", "movable (kg)", "on supports (kg)"));
        for (MassSource source : ledger.sources()) {
            for (int i = 0; i < TRANSLATIONS.size(); i++) {
                table.text(source.name()).text(TRANSLATIONS.get(i).word()).number(source.movable()[i]).number(source.onSupports()[i]).end();
            }
        }
        for (int i = 0; i < TRANSLATIONS.size(); i++) {
            table.text("all").text(TRANSLATIONS.get(i).word()).number(ledger.movable()[i]).number(ledger.onSupports()[i]).end();
        }
        return table;
    }

    private static TableText verdicts(List<Verdict> verdicts) {
        TableText table = new TableText(List.of("rule pack", "clause", "direction", "captured", "required", "pass", "reached at mode",
                "verdict"));
        for (Verdict verdict : verdicts) {
            table.text(verdict.rulePack()).text(verdict.clause()).text(verdict.direction().word()).number(verdict.captured())
                    .number(verdict.required()).text(verdict.pass() ? "yes" : "no").number(verdict.reachedAtMode()).text(verdict.text())
                    .end();
        }
        return table;
    }

    private static TableText findings(List<Finding> findings) {
        TableText table = new TableText(List.of("finding", "severity", "objects", "text", "remedy"));
        for (Finding finding : findings) {
            String objects = finding.objects().stream().map(ObjectRef::name).collect(Collectors.joining("; "));
            table.text(finding.id()).text(finding.severity().word()).text(objects).text(finding.text()).text(finding.remedy()).end();
        }
        return table;
    }
}
