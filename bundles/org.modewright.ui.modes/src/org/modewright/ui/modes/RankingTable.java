package org.modewright.ui.modes;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Objects;
import java.util.Set;
import java.util.function.Consumer;
import org.eclipse.swt.SWT;
import org.eclipse.swt.graphics.Color;
import org.eclipse.swt.graphics.Point;
import org.eclipse.swt.graphics.Rectangle;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swt.widgets.Event;
import org.eclipse.swt.widgets.Table;
import org.eclipse.swt.widgets.TableColumn;
import org.eclipse.swt.widgets.TableItem;
import org.modewright.fem.Kind;
import org.modewright.modal.Dominance.Energy;
import org.modewright.ui.UiIds;
import org.modewright.ui.widgets.Numbers;
import org.modewright.ui.widgets.ThemeColours;

/**
 * Elements, groups, levels, sections or materials ranked by their share of a mode's energy, with two-sided bars: strain energy to the
 * left of the name, kinetic energy to the right.
 */
final class RankingTable {

    private static final int STRAIN = 0;
    private static final int NAME = 1;
    private static final int KINETIC = 2;
    private static final int RUNNING = 3;
    private static final int MARGIN = 4;
    private static final int LEAST_SIDE = 88;
    private static final int LEAST_NAME = 96;
    private static final int RUNNING_WIDTH = 64;

    private final Table table;
    private final Consumer<Energy> whenRanked;
    private List<DominanceRow> rows = List.of();
    private double largest = 1;

    RankingTable(Composite parent, Consumer<List<DominanceRow>> whenSelected, Consumer<String> whenOpened, Consumer<Energy> whenRanked) {
        this.whenRanked = whenRanked;
        table = new Table(parent, SWT.VIRTUAL | SWT.MULTI | SWT.FULL_SELECTION | SWT.BORDER);
        table.setHeaderVisible(true);
        table.setData(UiIds.WIDGET_ID, "dominance.table");
        column(SWT.RIGHT, Messages.Dominance_strainShort, Messages.Dominance_strainTip, Energy.STRAIN);
        column(SWT.CENTER, "", null, null);
        column(SWT.LEFT, Messages.Dominance_kineticShort, Messages.Dominance_kineticTip, Energy.KINETIC);
        column(SWT.RIGHT, Messages.Dominance_running, Messages.Dominance_runningTip, null);
        table.addListener(SWT.SetData, this::fill);
        table.addListener(SWT.EraseItem, this::erase);
        table.addListener(SWT.PaintItem, this::paint);
        TextFit.install(table, index -> index == NAME);
        table.addListener(SWT.Resize, event -> fitColumns());
        table.addListener(SWT.Selection, event -> notifySelection(whenSelected));
        table.addListener(SWT.DefaultSelection, event -> open((TableItem) event.item, whenOpened));
        table.addListener(SWT.MouseMove, this::explain);
    }

    private void column(int style, String header, String tip, Energy ranks) {
        TableColumn column = new TableColumn(table, style);
        column.setText(header);
        column.setToolTipText(tip);
        if (ranks != null) {
            column.addListener(SWT.Selection, event -> whenRanked.accept(ranks));
        }
    }

    Control control() {
        return table;
    }

    /** Shows rows. */
    void show(List<DominanceRow> newRows, String nameHeader, Energy rankedBy) {
        rows = newRows;
        largest = rows.stream().mapToDouble(row -> Math.max(row.strain(), row.kinetic())).max().orElse(1);
        table.getColumn(NAME).setText(nameHeader);
        table.setSortColumn(table.getColumn(rankedBy == Energy.STRAIN ? STRAIN : KINETIC));
        table.setSortDirection(SWT.DOWN);
        table.deselectAll();
        table.setItemCount(rows.size());
        table.clearAll();
        fitColumns();
    }

    /** Selects the rows of elements, without telling. */
    void select(Set<String> elementIds) {
        List<Integer> chosen = new ArrayList<>();
        for (int i = 0; i < rows.size(); i++) {
            if (rows.get(i).elementId() != null && elementIds.contains(rows.get(i).elementId())) {
                chosen.add(i);
            }
        }
        table.deselectAll();
        table.select(chosen.stream().mapToInt(Integer::intValue).toArray());
        if (!chosen.isEmpty()) {
            table.setTopIndex(Math.min(table.getTopIndex(), chosen.get(0)));
            table.showItem(table.getItem(chosen.get(0)));
        }
    }

    private void fitColumns() {
        int room = table.getClientArea().width;
        if (room <= 0) {
            return;
        }
        int running = RUNNING_WIDTH;
        int side = Math.max(LEAST_SIDE, (room - running) * 30 / 100);
        int name = Math.max(LEAST_NAME, room - 2 * side - running);
        setWidth(STRAIN, side);
        setWidth(NAME, name);
        setWidth(KINETIC, side);
        setWidth(RUNNING, running);
    }

    private void setWidth(int column, int width) {
        if (table.getColumn(column).getWidth() != width) {
            table.getColumn(column).setWidth(width);
        }
    }

    private String label(DominanceRow row) {
        if (row.kind() != null && row.kind() != Kind.MEMBER && !row.label().startsWith(row.kind().word())) {
            return row.kind().word() + " " + row.label();
        }
        return row.label().isEmpty() ? Messages.Dominance_none : row.label();
    }

    private void fill(Event event) {
        if (event.index >= rows.size()) {
            return;
        }
        DominanceRow row = rows.get(event.index);
        ((TableItem) event.item).setText(new String[] {Numbers.percentNumber(row.strain()), label(row),
                Numbers.percentNumber(row.kinetic()),
            Numbers.percentNumber(row.running())});
    }

    private static boolean isBar(int column) {
        return column == STRAIN || column == KINETIC;
    }

    /** The cells with bars are drawn whole: their text stands at the side of the name. */
    private void erase(Event event) {
        if (isBar(event.index)) {
            event.detail &= ~SWT.FOREGROUND;
        }
    }

    private void paint(Event event) {
        int index = table.indexOf((TableItem) event.item);
        if (!isBar(event.index) || index < 0 || index >= rows.size()) {
            return;
        }
        Rectangle cell = ((TableItem) event.item).getBounds(event.index);
        boolean strain = event.index == STRAIN;
        double share = strain ? rows.get(index).strain() : rows.get(index).kinetic();
        String text = Numbers.percentNumber(share);
        int textRoom = event.gc.textExtent("100.0").x + 2 * MARGIN;
        int width = (int) Math.round(Math.max(0, cell.width - textRoom - 2 * MARGIN) * share / largest);
        event.gc.setBackground(barColour(strain));
        int barX = strain ? cell.x + cell.width - MARGIN - width : cell.x + MARGIN;
        event.gc.fillRectangle(barX, cell.y + MARGIN, width, cell.height - 2 * MARGIN);
        Point size = event.gc.textExtent(text);
        int textX = strain ? barX - MARGIN - size.x : barX + width + MARGIN;
        event.gc.drawText(text, textX, cell.y + (cell.height - size.y) / 2, true);
    }

    /** Two shades of the text colour: energies have no direction, so they take none of its colours. */
    private Color barColour(boolean strain) {
        return ThemeColours.mix(table.getForeground(), table.getBackground(), strain ? 0.55 : 0.3);
    }

    private void notifySelection(Consumer<List<DominanceRow>> whenSelected) {
        List<DominanceRow> chosen = Arrays.stream(table.getSelectionIndices()).mapToObj(rows::get).toList();
        if (!chosen.isEmpty()) {
            whenSelected.accept(chosen);
        }
    }

    private void open(TableItem item, Consumer<String> whenOpened) {
        int index = table.indexOf(item);
        if (index >= 0 && index < rows.size() && rows.get(index).elementId() != null) {
            whenOpened.accept(rows.get(index).elementId());
        }
    }

    private void explain(Event event) {
        TableItem item = table.getItem(new Point(event.x, event.y));
        int index = item == null ? -1 : table.indexOf(item);
        String tip = null;
        if (index >= 0 && index < rows.size()) {
            DominanceRow row = rows.get(index);
            tip = label(row) + "\n" + Messages.Dominance_strain + " " + row.strain() * 100 + "\n" + Messages.Dominance_kinetic + " "
                    + row.kinetic() * 100;
        }
        if (!Objects.equals(tip, table.getToolTipText())) {
            table.setToolTipText(tip);
        }
    }

    /** All rows as text, tab-separated, in full precision. */
    String text() {
        StringBuilder text = new StringBuilder();
        text.append(table.getColumn(NAME).getText()).append('\t').append(Messages.Dominance_strain).append('\t')
                .append(Messages.Dominance_kinetic);
        for (DominanceRow row : rows) {
            text.append('\n').append(label(row)).append('\t').append(Numbers.exact(row.strain() * 100)).append('\t')
                    .append(Numbers.exact(row.kinetic() * 100));
        }
        return text.toString();
    }
}
