package org.modewright.ui.editor.pages;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Locale;
import java.util.Set;
import java.util.function.Consumer;
import java.util.stream.IntStream;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.jface.resource.JFaceResources;
import org.eclipse.jface.resource.LocalResourceManager;
import org.eclipse.swt.SWT;
import org.eclipse.swt.graphics.GC;
import org.eclipse.swt.graphics.Point;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Event;
import org.eclipse.swt.widgets.Table;
import org.eclipse.swt.widgets.TableColumn;
import org.eclipse.swt.widgets.TableItem;
import org.modewright.audit.Finding;
import org.modewright.audit.Severity;
import org.modewright.model.structure.Identified;
import org.modewright.ui.UiIds;
import org.modewright.ui.editor.EditorContext;
import org.modewright.ui.editor.fields.Field;
import org.modewright.ui.widgets.Images;

/** Objects of one kind, a row each: virtual, sorted by a click on a header, filtered, edited in the cells. */
final class ObjectTable {

    private static final int LEAST_WIDTH = 64;
    private static final int SAMPLE = 200;

    private final EditorContext context;
    private final Table table;
    private final CellEditing editing;
    private final LocalResourceManager images;
    private List<Field> fields = List.of();
    private List<? extends Identified> objects = List.of();
    private String filter = "";
    private int sortedBy = -1;
    private boolean descending;
    private Identified[] rows = new Identified[0];

    ObjectTable(Composite parent, EditorContext context, Consumer<Set<String>> whenSelected) {
        this.context = context;
        table = new Table(parent, SWT.VIRTUAL | SWT.MULTI | SWT.FULL_SELECTION | SWT.BORDER);
        table.setHeaderVisible(true);
        table.setLinesVisible(true);
        table.setData(UiIds.WIDGET_ID, "tables.table");
        images = new LocalResourceManager(JFaceResources.getResources(), table);
        editing = new CellEditing(table, context);
        table.addListener(SWT.SetData, this::fill);
        table.addListener(SWT.Selection, event -> whenSelected.accept(selectedIds()));
        table.addListener(SWT.MouseMove, this::explain);
        table.addListener(SWT.MouseDoubleClick, this::doubleClicked);
        table.addListener(SWT.KeyDown, this::key);
    }

    Table table() {
        return table;
    }

    /** Shows other objects with other columns. */
    void show(List<Field> newFields, List<? extends Identified> newObjects) {
        fields = newFields;
        objects = newObjects;
        sortedBy = -1;
        editing.close();
        buildColumns();
        refresh();
    }

    /** Shows the same objects after a change. */
    void refresh() {
        Set<String> selected = selectedIds();
        rows = sorted();
        table.setItemCount(rows.length);
        table.clearAll();
        select(selected);
    }

    void filter(String words) {
        filter = words.strip().toLowerCase(Locale.ROOT);
        refresh();
    }

    int count() {
        return rows.length;
    }

    private Set<String> selectedIds() {
        Set<String> ids = new LinkedHashSet<>();
        for (int index : table.getSelectionIndices()) {
            if (index < rows.length) {
                ids.add(rows[index].getId());
            }
        }
        return ids;
    }

    List<Identified> selected() {
        return Arrays.stream(table.getSelectionIndices()).filter(index -> index < rows.length).mapToObj(index -> rows[index]).toList();
    }

    void selectAll() {
        table.selectAll();
    }

    /** Selects the rows of objects, without telling. */
    void select(Set<String> ids) {
        int[] chosen = ids.isEmpty() ? new int[0] : IntStream.range(0, rows.length).filter(index -> ids.contains(rows[index].getId())).toArray();
        int[] now = table.getSelectionIndices();
        Arrays.sort(now);
        if (Arrays.equals(now, chosen)) {
            return;
        }
        table.deselectAll();
        if (chosen.length > 0) {
            table.setSelection(chosen);
            table.showSelection();
        }
    }

    /** The selected rows as text, or all if none is selected: tab-separated, with the headers. */
    String text() {
        List<Identified> chosen = table.getSelectionCount() == 0 ? List.of(rows) : selected();
        StringBuilder text = new StringBuilder(String.join("\t", fields.stream().map(Field::label).toList())).append('\n');
        for (Identified object : chosen) {
            text.append(String.join("\t", fields.stream().map(field -> field.text(object)).toList())).append('\n');
        }
        return text.toString();
    }

    private void buildColumns() {
        table.setRedraw(false);
        try {
            for (TableColumn column : table.getColumns()) {
                column.dispose();
            }
            GC gc = new GC(table);
            try {
                for (int i = 0; i < fields.size(); i++) {
                    addColumn(i, gc);
                }
            } finally {
                gc.dispose();
            }
            table.setSortColumn(null);
        } finally {
            table.setRedraw(true);
        }
    }

    private void addColumn(int index, GC gc) {
        Field field = fields.get(index);
        TableColumn column = new TableColumn(table, field.isNumber() ? SWT.RIGHT : SWT.LEFT);
        column.setText(field.label());
        column.setToolTipText(field.help());
        int width = gc.textExtent(field.label()).x + 36;
        for (EObject object : objects.subList(0, Math.min(SAMPLE, objects.size()))) {
            width = Math.max(width, Math.min(240, gc.textExtent(field.text(object)).x + (index == 0 ? 40 : 24)));
        }
        column.setWidth(Math.max(LEAST_WIDTH, width));
        column.addListener(SWT.Selection, event -> sortBy(index));
    }

    private void sortBy(int column) {
        descending = column == sortedBy && !descending;
        sortedBy = column;
        table.setSortColumn(table.getColumn(column));
        table.setSortDirection(descending ? SWT.DOWN : SWT.UP);
        refresh();
    }

    private Identified[] sorted() {
        List<Identified> shown = new ArrayList<>();
        for (Identified object : objects) {
            if (filter.isEmpty() || fields.stream().anyMatch(field -> field.text(object).toLowerCase(Locale.ROOT).contains(filter))) {
                shown.add(object);
            }
        }
        if (sortedBy >= 0) {
            Comparator<Identified> order = order(fields.get(sortedBy));
            shown.sort(descending ? order.reversed() : order);
        }
        return shown.toArray(new Identified[0]);
    }

    @SuppressWarnings("unchecked")
    private static Comparator<Identified> order(Field field) {
        return Comparator.comparing(object -> (Comparable<Object>) field.sortKey(object));
    }

    private void fill(Event event) {
        if (event.index >= rows.length) {
            return;
        }
        Identified object = rows[event.index];
        TableItem item = (TableItem) event.item;
        for (int i = 0; i < fields.size(); i++) {
            Field field = fields.get(i);
            item.setText(i, field.style() == Field.Style.FLAG ? Boolean.parseBoolean(field.text(object)) ? "✓" : "" : field.text(object));
        }
        List<Finding> findings = context.findings(object.getId());
        item.setImage(0, findings.isEmpty() ? null : images.get(Images.descriptor(sign(findings.get(0).severity()))));
    }

    private static String sign(Severity severity) {
        return switch (severity) {
            case ERROR -> Images.ERROR;
            case WARNING -> Images.WARNING;
            case INFO -> Images.INFORMATION;
        };
    }

    private void explain(Event event) {
        TableItem item = table.getItem(new Point(event.x, event.y));
        int row = item == null ? -1 : table.indexOf(item);
        String tip = null;
        if (row >= 0 && row < rows.length) {
            List<String> lines = context.findings(rows[row].getId()).stream().map(finding -> finding.text() + " " + finding.remedy()).toList();
            tip = lines.isEmpty() ? null : String.join("\n", lines);
        }
        if (!java.util.Objects.equals(tip, table.getToolTipText())) {
            table.setToolTipText(tip);
        }
    }

    private void doubleClicked(Event event) {
        TableItem item = table.getItem(new Point(event.x, event.y));
        if (item == null) {
            return;
        }
        for (int column = 0; column < fields.size(); column++) {
            if (item.getBounds(column).contains(event.x, event.y)) {
                edit(table.indexOf(item), column);
                return;
            }
        }
    }

    private void key(Event event) {
        if ((event.keyCode == SWT.F2 || event.keyCode == SWT.CR) && table.getSelectionIndex() >= 0) {
            edit(table.getSelectionIndex(), 0);
            event.doit = false;
        }
    }

    private void edit(int row, int column) {
        if (row >= 0 && row < rows.length) {
            editing.open(table.getItem(row), column, fields.get(column), rows[row], next -> edit(row, next), fields.size());
        }
    }
}
