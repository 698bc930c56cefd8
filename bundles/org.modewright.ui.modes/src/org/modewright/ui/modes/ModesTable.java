package org.modewright.ui.modes;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.EnumSet;
import java.util.List;
import java.util.Objects;
import java.util.Set;
import java.util.function.IntConsumer;
import java.util.stream.IntStream;
import org.eclipse.swt.SWT;
import org.eclipse.swt.graphics.GC;
import org.eclipse.swt.graphics.Point;
import org.eclipse.swt.graphics.Rectangle;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swt.widgets.Event;
import org.eclipse.swt.widgets.Table;
import org.eclipse.swt.widgets.TableColumn;
import org.eclipse.swt.widgets.TableItem;
import org.modewright.ui.UiIds;
import org.modewright.ui.widgets.DirectionColours;
import org.modewright.ui.widgets.TextCopy;
import org.modewright.ui.widgets.ThemeColours;

/** The table of modes: virtual, sorted by a click on a header, with a bar in each cell of mass and signs that say why. */
final class ModesTable {

    private static final int BAR_HEIGHT = 3;
    private static final int CELL_MARGIN = 4;
    private static final int HEADER_ROOM = 24;

    private final Table table;
    private final Set<ModeColumn> shown = EnumSet.noneOf(ModeColumn.class);
    private ModeRows rows;
    private ModeFilter filter = ModeFilter.ALL;
    private ModeColumn sortedBy = ModeColumn.NUMBER;
    private boolean descending;
    private int[] order = new int[0];

    ModesTable(Composite parent, IntConsumer whenSelected, Runnable whenOpened) {
        table = new Table(parent, SWT.VIRTUAL | SWT.MULTI | SWT.FULL_SELECTION | SWT.BORDER);
        table.setHeaderVisible(true);
        table.setData(UiIds.WIDGET_ID, "modes.table");
        table.addListener(SWT.SetData, this::fill);
        table.addListener(SWT.PaintItem, this::paintBar);
        TextFit.install(table, index -> table.getColumn(index).getData() == ModeColumn.CHARACTER);
        table.addListener(SWT.Selection, event -> notifySelection(whenSelected));
        table.addListener(SWT.DefaultSelection, event -> whenOpened.run());
        table.addListener(SWT.MouseMove, this::explain);
        table.addListener(SWT.Resize, event -> fitWords());
        for (ModeColumn column : ModeColumn.values()) {
            if (column.isShownAtFirst()) {
                shown.add(column);
            }
        }
        buildColumns();
    }

    Control control() {
        return table;
    }

    Set<ModeColumn> shownColumns() {
        return EnumSet.copyOf(shown);
    }

    /** Shows or hides a column; the mode's number stays. */
    void show(ModeColumn column, boolean visible) {
        if (column == ModeColumn.NUMBER) {
            return;
        }
        if (visible ? shown.add(column) : shown.remove(column)) {
            buildColumns();
            refresh();
        }
    }

    void setRows(ModeRows newRows) {
        rows = newRows;
        refresh();
    }

    void setFilter(ModeFilter newFilter) {
        filter = newFilter;
        refresh();
    }

    /** How many rows pass the filter. */
    int shownCount() {
        return order.length;
    }

    /** Selects the row of a mode, without telling; -1 or a mode that is filtered out: none. */
    void select(int mode) {
        int row = rowOf(mode);
        if (row < 0) {
            table.deselectAll();
        } else if (!table.isSelected(row) || table.getSelectionCount() != 1) {
            table.setSelection(row);
            table.showSelection();
        }
    }

    void redrawSigns() {
        table.clearAll();
    }

    void selectAll() {
        table.selectAll();
    }

    /** Puts rows on the clipboard as text, tab-separated, with a header, in full precision. */
    void copy(boolean all) {
        if (rows == null || order.length == 0) {
            return;
        }
        int[] chosen = all || table.getSelectionCount() == 0 ? IntStream.range(0, order.length).toArray() : table.getSelectionIndices();
        Arrays.sort(chosen);
        TextCopy.put(table.getDisplay(), text(chosen));
    }

    /** Rows as text, tab-separated, with a header. */
    String text(int[] chosen) {
        StringBuilder text = new StringBuilder();
        List<ModeColumn> columns = new ArrayList<>(shown);
        text.append(String.join("\t", columns.stream().map(ModeColumn::header).toList())).append('\n');
        for (int row : chosen) {
            text.append(String.join("\t", columns.stream().map(column -> column.exact(rows, order[row])).toList())).append('\n');
        }
        return text.toString();
    }

    private void buildColumns() {
        table.setRedraw(false);
        try {
            for (TableColumn column : table.getColumns()) {
                column.dispose();
            }
            for (ModeColumn column : shown) {
                addColumn(column);
            }
            showSort();
            fitWords();
        } finally {
            table.setRedraw(true);
        }
    }

    private void addColumn(ModeColumn column) {
        TableColumn widget = new TableColumn(table, column.isNumeric() ? SWT.RIGHT : SWT.LEFT);
        widget.setText(column.header());
        widget.setToolTipText(column.tip());
        widget.setData(column);
        widget.setMoveable(true);
        widget.setWidth(widthOf(column));
        widget.addListener(SWT.Selection, event -> sortBy(column));
    }

    /** Wide enough for the header in the platform's font, with room for the sign of the sorted column. */
    private int widthOf(ModeColumn column) {
        GC gc = new GC(table);
        try {
            return Math.max(column.width(), gc.textExtent(column.header()).x + HEADER_ROOM);
        } finally {
            gc.dispose();
        }
    }

    /** The column of words takes the room that the numbers leave. */
    private void fitWords() {
        int room = table.getClientArea().width;
        TableColumn words = null;
        for (TableColumn column : table.getColumns()) {
            if (column.getData() == ModeColumn.CHARACTER) {
                words = column;
            } else {
                room -= column.getWidth();
            }
        }
        int width = Math.max(ModeColumn.CHARACTER.width(), room);
        if (words != null && width != words.getWidth()) {
            words.setWidth(width);
        }
    }

    private void sortBy(ModeColumn column) {
        descending = column == sortedBy ? !descending : column.direction() != null || column == ModeColumn.PERIOD;
        sortedBy = column;
        showSort();
        refresh();
    }

    private void showSort() {
        for (TableColumn column : table.getColumns()) {
            if (column.getData() == sortedBy) {
                table.setSortColumn(column);
                table.setSortDirection(descending ? SWT.DOWN : SWT.UP);
                return;
            }
        }
        table.setSortColumn(null);
    }

    private void refresh() {
        int selected = table.getSelectionCount() == 1 ? order[table.getSelectionIndex()] : -1;
        order = rows == null ? new int[0] : sorted();
        table.setItemCount(order.length);
        table.clearAll();
        if (rows != null && selected < rows.count()) {
            select(selected);
        }
    }

    private int[] sorted() {
        Comparator<Integer> comparator = sortedBy.order(rows);
        return IntStream.range(0, rows.count()).filter(mode -> filter.accepts(rows, mode)).boxed()
                .sorted(descending ? comparator.reversed() : comparator).mapToInt(Integer::intValue).toArray();
    }

    private int rowOf(int mode) {
        for (int row = 0; row < order.length; row++) {
            if (order[row] == mode) {
                return row;
            }
        }
        return -1;
    }

    private void fill(Event event) {
        TableItem item = (TableItem) event.item;
        int row = event.index;
        if (rows == null || row >= order.length) {
            return;
        }
        TableColumn[] columns = table.getColumns();
        for (int i = 0; i < columns.length; i++) {
            ModeColumn column = (ModeColumn) columns[i].getData();
            item.setText(i, column.text(rows, order[row]));
        }
    }

    private void paintBar(Event event) {
        int row = table.indexOf((TableItem) event.item);
        ModeColumn column = (ModeColumn) table.getColumn(event.index).getData();
        if (rows == null || row < 0 || row >= order.length || column.direction() == null) {
            return;
        }
        Rectangle cell = ((TableItem) event.item).getBounds(event.index);
        int room = cell.width - 2 * CELL_MARGIN;
        int width = (int) Math.round(room * column.bar(rows, order[row]));
        if (width <= 0) {
            return;
        }
        event.gc.setBackground(column.direction().isTranslation() ? DirectionColours.of(column.direction())
                : ThemeColours.mix(DirectionColours.of(column.direction()), table.getBackground(), 0.6));
        event.gc.fillRectangle(cell.x + cell.width - CELL_MARGIN - width, cell.y + cell.height - BAR_HEIGHT - 1, width, BAR_HEIGHT);
    }

    private void notifySelection(IntConsumer whenSelected) {
        if (table.getSelectionCount() == 1) {
            whenSelected.accept(order[table.getSelectionIndex()]);
        }
    }

    /** The tooltip says why a mode carries its signs, and gives a number in full precision. */
    private void explain(Event event) {
        TableItem item = table.getItem(new Point(event.x, event.y));
        String tip = null;
        if (item != null && rows != null) {
            int row = table.indexOf(item);
            tip = row < order.length ? tip(item, event, order[row]) : null;
        }
        if (!Objects.equals(tip, table.getToolTipText())) {
            table.setToolTipText(tip);
        }
    }

    private String tip(TableItem item, Event event, int mode) {
        for (int i = 0; i < table.getColumnCount(); i++) {
            if (item.getBounds(i).contains(event.x, event.y)) {
                ModeColumn column = (ModeColumn) table.getColumn(i).getData();
                String reasons = rows.reasons(mode);
                return column == ModeColumn.NUMBER ? (reasons.isEmpty() ? null : reasons)
                        : column == ModeColumn.CHARACTER && !reasons.isEmpty() ? column.text(rows, mode) + "\n" + reasons
                        : column.exact(rows, mode);
            }
        }
        return null;
    }
}
