package org.modewright.ui.modes;

import java.util.List;
import org.eclipse.osgi.util.NLS;
import org.eclipse.swt.SWT;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swt.widgets.Table;
import org.eclipse.swt.widgets.TableColumn;
import org.eclipse.swt.widgets.TableItem;
import org.modewright.fem.MassLedger;
import org.modewright.fem.MassSource;
import org.modewright.ui.UiIds;
import org.modewright.ui.widgets.Numbers;
import org.modewright.ui.widgets.TextCopy;

/** The masses by source: per direction what can move and, apart from it, what sits on supports. */
final class MassTable {

    private static final List<String> AXES = List.of("X", "Y", "Z");

    private final Table table;
    private double unit = 1;

    MassTable(Composite parent) {
        table = new Table(parent, SWT.FULL_SELECTION | SWT.MULTI | SWT.BORDER);
        table.setHeaderVisible(true);
        table.setData(UiIds.WIDGET_ID, "capture.masses");
        new TableColumn(table, SWT.LEFT);
        for (int i = 0; i < 2 * AXES.size(); i++) {
            new TableColumn(table, SWT.RIGHT);
        }
    }

    Control control() {
        return table;
    }

    /**
     * Shows the masses.
     *
     * @param ledger masses in kg; null: nothing
     * @param unitInKilograms the model's unit of mass, kg
     * @param symbol its symbol
     */
    void show(MassLedger ledger, double unitInKilograms, String symbol) {
        unit = unitInKilograms;
        table.setRedraw(false);
        try {
            table.removeAll();
            label(symbol);
            if (ledger != null) {
                for (MassSource source : ledger.sources()) {
                    add(source.name(), source.movable(), source.onSupports());
                }
                add(Messages.Capture_total, ledger.movable(), ledger.onSupports());
            }
            pack();
        } finally {
            table.setRedraw(true);
        }
    }

    private void label(String symbol) {
        table.getColumn(0).setText(NLS.bind(Messages.Capture_source, symbol));
        for (int axis = 0; axis < AXES.size(); axis++) {
            table.getColumn(1 + axis).setText(NLS.bind(Messages.Capture_movable, AXES.get(axis)));
            table.getColumn(1 + AXES.size() + axis).setText(NLS.bind(Messages.Capture_onSupports, AXES.get(axis)));
        }
    }

    private void add(String name, double[] movable, double[] onSupports) {
        TableItem item = new TableItem(table, SWT.NONE);
        item.setText(0, name);
        for (int axis = 0; axis < AXES.size(); axis++) {
            item.setText(1 + axis, text(movable[axis], movable));
            item.setText(1 + AXES.size() + axis, text(onSupports[axis], movable));
        }
        item.setData(new double[][] {movable, onSupports});
    }

    /** A mass in the model's unit; what is round-off beside the mass of its row is nothing. */
    private String text(double mass, double[] row) {
        double scale = Math.max(Math.abs(row[0]), Math.max(Math.abs(row[1]), Math.abs(row[2])));
        return Numbers.significant(Math.abs(mass) < 1e-12 * scale ? 0 : mass / unit, 4);
    }

    private void pack() {
        for (TableColumn column : table.getColumns()) {
            column.pack();
            column.setWidth(column.getWidth() + 8);
        }
    }

    /** Copies all rows as text in full precision. */
    void copy() {
        StringBuilder text = new StringBuilder();
        for (TableColumn column : table.getColumns()) {
            text.append(text.isEmpty() ? "" : "\t").append(column.getText());
        }
        for (TableItem item : table.getItems()) {
            double[][] masses = (double[][]) item.getData();
            text.append('\n').append(item.getText(0));
            for (double[] part : masses) {
                for (double mass : part) {
                    text.append('\t').append(Numbers.exact(mass / unit));
                }
            }
        }
        TextCopy.put(table.getDisplay(), text.toString());
    }
}
