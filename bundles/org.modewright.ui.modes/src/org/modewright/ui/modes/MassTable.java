package org.modewright.ui.modes;

import java.util.List;
import org.eclipse.jface.resource.FontDescriptor;
import org.eclipse.jface.resource.JFaceResources;
import org.eclipse.jface.resource.LocalResourceManager;
import org.eclipse.osgi.util.NLS;
import org.eclipse.swt.SWT;
import org.eclipse.swt.graphics.Font;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swt.widgets.Table;
import org.eclipse.swt.widgets.TableColumn;
import org.eclipse.swt.widgets.TableItem;
import org.modewright.modal.ModalResult;
import org.modewright.ui.UiIds;
import org.modewright.ui.widgets.Numbers;
import org.modewright.ui.widgets.TextCopy;

/** The ledger of masses: what can move, what of it the modes hold, and what sits on supports. */
final class MassTable {

    private static final List<String> AXES = List.of("X", "Y", "Z");
    private static final String INDENT = "    ";
    private static final int LEAST_NUMBER = 72;
    private static final int LEAST_LABEL = 120;
    private static final double ROUND_OFF = 1e-12;

    private final Table table;
    private final Font bold;
    private List<MassRow> rows = List.of();
    private double unit = 1;
    private double scale;

    MassTable(Composite parent) {
        table = new Table(parent, SWT.FULL_SELECTION | SWT.MULTI);
        table.setHeaderVisible(true);
        table.setData(UiIds.WIDGET_ID, "capture.masses");
        bold = new LocalResourceManager(JFaceResources.getResources(), table)
                .create(FontDescriptor.createFrom(table.getFont()).setStyle(SWT.BOLD));
        new TableColumn(table, SWT.LEFT);
        AXES.forEach(axis -> new TableColumn(table, SWT.RIGHT).setText(axis));
        table.addListener(SWT.Resize, event -> fitColumns());
    }

    Control control() {
        return table;
    }

    /**
     * Shows the masses of a run.
     *
     * @param result the run; null: nothing
     * @param unitInKilograms the model's unit of mass, kg
     * @param symbol its symbol
     */
    void show(ModalResult result, double unitInKilograms, String symbol) {
        unit = unitInKilograms;
        rows = result == null ? List.of() : MassRow.of(result);
        scale = rows.stream().mapToDouble(row -> largest(row.kilograms())).max().orElse(0);
        table.getColumn(0).setText(NLS.bind(Messages.Capture_source, symbol));
        table.setRedraw(false);
        try {
            table.removeAll();
            rows.forEach(this::add);
            fitColumns();
        } finally {
            table.setRedraw(true);
        }
    }

    private static double largest(double[] masses) {
        double largest = 0;
        for (double mass : masses) {
            largest = Math.abs(mass) > largest ? Math.abs(mass) : largest;
        }
        return largest;
    }

    private void add(MassRow row) {
        TableItem item = new TableItem(table, SWT.NONE);
        item.setText(0, row.isTotal() ? row.label() : INDENT + row.label());
        for (int axis = 0; axis < AXES.size(); axis++) {
            item.setText(1 + axis, text(row.kilograms()[axis]));
        }
        if (row.isTotal()) {
            item.setFont(bold);
        }
    }

    /** A mass in the model's unit; what is round-off beside the largest mass is nothing. */
    private String text(double mass) {
        return Double.isNaN(mass) ? "–" : Numbers.significant(Math.abs(mass) < ROUND_OFF * scale ? 0 : mass / unit, 4);
    }

    private void fitColumns() {
        int room = table.getClientArea().width;
        if (room <= 0) {
            return;
        }
        int number = Math.max(LEAST_NUMBER, room / 6);
        table.getColumn(0).setWidth(Math.max(LEAST_LABEL, room - AXES.size() * number));
        for (int axis = 0; axis < AXES.size(); axis++) {
            table.getColumn(1 + axis).setWidth(number);
        }
    }

    /** All rows as text, tab-separated, in full precision. */
    String text() {
        StringBuilder text = new StringBuilder(table.getColumn(0).getText()).append('\t').append(String.join("\t", AXES));
        for (MassRow row : rows) {
            text.append('\n').append(row.label());
            for (double mass : row.kilograms()) {
                text.append('\t').append(Double.isNaN(mass) ? "" : Numbers.exact(mass / unit));
            }
        }
        return text.toString();
    }

    void copy() {
        TextCopy.put(table.getDisplay(), text());
    }
}
