package org.modewright.testsupport;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.concurrent.Callable;
import org.eclipse.swt.SWT;
import org.eclipse.swt.widgets.Table;
import org.eclipse.swt.widgets.TableColumn;
import org.eclipse.swt.widgets.TableItem;

/** A table as a user sees it. */
public final class TableObject {

    private final UiThread ui;
    private final Callable<Table> table;
    private final String name;

    TableObject(UiThread ui, String name, Callable<Table> table) {
        this.ui = ui;
        this.name = name;
        this.table = table;
    }

    /** Number of rows; 0 if the table is not there. */
    public int rowCount() {
        return ui.get(() -> table.call() == null ? 0 : table.call().getItemCount());
    }

    /** Waits until the table has rows. */
    public TableObject waitForRows() {
        ui.waitUntil("rows in the table " + name, () -> table.call() != null && table.call().getItemCount() > 0);
        return this;
    }

    /** The headers from left to right as the user sees them. */
    public List<String> headers() {
        return ui.get(() -> {
            List<String> headers = new ArrayList<>();
            for (int index : there().getColumnOrder()) {
                headers.add(there().getColumn(index).getText());
            }
            return headers;
        });
    }

    /** Text of a cell. */
    public String text(int row, String header) {
        return ui.get(() -> there().getItem(row).getText(column(header)));
    }

    /** Texts of a row's cells in the order of the columns' creation. */
    public List<String> row(int row) {
        return ui.get(() -> {
            TableItem item = there().getItem(row);
            List<String> texts = new ArrayList<>();
            for (int i = 0; i < Math.max(1, there().getColumnCount()); i++) {
                texts.add(item.getText(i));
            }
            return texts;
        });
    }

    /** Selects a row as a click does. */
    public void select(int row) {
        ui.run(() -> {
            Table widget = thereUnchecked();
            widget.setFocus();
            widget.setSelection(row);
            Widgets.notifySelection(widget, widget.getItem(row), SWT.Selection);
        });
    }

    /** Clicks a header, by which the table is sorted. */
    public void clickHeader(String header) {
        ui.run(() -> Widgets.notifySelection(thereUnchecked().getColumn(columnUnchecked(header)), null, SWT.Selection));
    }

    private int columnUnchecked(String header) {
        try {
            return column(header);
        } catch (Exception failure) {
            throw new IllegalStateException(failure);
        }
    }

    /** Opens a row as a double click or Enter does. */
    public void open(int row) {
        ui.run(() -> {
            Table widget = thereUnchecked();
            widget.setSelection(row);
            Widgets.notifySelection(widget, widget.getItem(row), SWT.DefaultSelection);
        });
    }

    /** The selected rows. */
    public List<Integer> selection() {
        return ui.get(() -> Arrays.stream(there().getSelectionIndices()).boxed().toList());
    }

    private int column(String header) throws Exception {
        TableColumn[] columns = there().getColumns();
        for (int i = 0; i < columns.length; i++) {
            if (columns[i].getText().equals(header)) {
                return i;
            }
        }
        throw new AssertionError("The table " + name + " has no column " + header + " but "
                + Arrays.stream(columns).map(TableColumn::getText).toList());
    }

    private Table there() throws Exception {
        Table found = table.call();
        if (found == null) {
            throw new AssertionError("There is no table " + name + ".");
        }
        return found;
    }

    private Table thereUnchecked() {
        try {
            return there();
        } catch (Exception failure) {
            throw new IllegalStateException(failure);
        }
    }
}
