package org.modewright.ui.editor.pages;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Collection;
import java.util.Collections;
import java.util.Comparator;
import java.util.IdentityHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Objects;
import java.util.Set;
import java.util.function.Consumer;
import java.util.function.Predicate;
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

    private static final int LEAST_WIDTH = 48;
    private static final int REST = 4;
    private static final int MOST_WIDTH = 240;
    private static final int HEADER_ROOM = 28;
    private static final int CELL_ROOM = 20;
    private static final int SIGN_ROOM = 16;
    private static final int SAMPLE = 200;

    private final EditorContext context;
    private final Table table;
    private final CellEditing editing;
    private final LocalResourceManager images;
    private List<Field> fields = List.of();
    private List<? extends EObject> objects = List.of();
    private String filter = "";
    private int sortedBy = -1;
    private boolean descending;
    private int column;
    private EObject[] rows = new EObject[0];

    /** @param whenSelected gets the selected objects when the user selects others */
    ObjectTable(Composite parent, EditorContext context, String id, Consumer<List<EObject>> whenSelected) {
        this.context = context;
        table = new Table(parent, SWT.VIRTUAL | SWT.MULTI | SWT.FULL_SELECTION | SWT.BORDER);
        table.setHeaderVisible(true);
        table.setData(UiIds.WIDGET_ID, id);
        images = new LocalResourceManager(JFaceResources.getResources(), table);
        editing = new CellEditing(table, context);
        table.addListener(SWT.SetData, this::fill);
        table.addListener(SWT.Selection, event -> whenSelected.accept(selected()));
        table.addListener(SWT.MouseMove, this::explain);
        table.addListener(SWT.MouseDown, this::pointed);
        table.addListener(SWT.MouseDoubleClick, this::doubleClicked);
        table.addListener(SWT.KeyDown, this::key);
    }

    Table table() {
        return table;
    }

    /** Shows other objects with other columns. */
    void show(List<Field> newFields, List<? extends EObject> newObjects) {
        boolean sameColumns = labels(newFields).equals(labels(fields));
        fields = newFields;
        objects = newObjects;
        if (!sameColumns) {
            editing.close();
            sortedBy = -1;
            column = 0;
            buildColumns();
        }
        refresh();
    }

    private static List<String> labels(List<Field> of) {
        return of.stream().map(Field::label).toList();
    }

    /** Shows the same objects after a change. */
    void refresh() {
        Set<EObject> chosen = identitySet(selected());
        rows = sorted();
        table.setItemCount(rows.length);
        table.clearAll();
        selectRows(chosen::contains, false);
        editing.follow(this::item);
    }

    private static Set<EObject> identitySet(Collection<EObject> of) {
        Set<EObject> set = Collections.newSetFromMap(new IdentityHashMap<>());
        set.addAll(of);
        return set;
    }

    private TableItem item(EObject object) {
        return IntStream.range(0, rows.length).filter(row -> rows[row] == object).mapToObj(table::getItem).findFirst().orElse(null);
    }

    /** Shows other findings. */
    void findingsChanged() {
        table.clearAll();
    }

    void filter(String words) {
        filter = words.strip().toLowerCase(Locale.ROOT);
        refresh();
    }

    int count() {
        return rows.length;
    }

    List<EObject> selected() {
        List<EObject> chosen = new ArrayList<>();
        for (int index : table.getSelectionIndices()) {
            if (index < rows.length) {
                chosen.add(rows[index]);
            }
        }
        return chosen;
    }

    void selectAll() {
        table.selectAll();
    }

    /** Selects the rows of objects by id, without telling. */
    void select(Set<String> ids) {
        selectRows(row -> row instanceof Identified object && ids.contains(object.getId()), true);
    }

    /** Selects the rows of objects, without telling. */
    void select(Collection<? extends EObject> chosen) {
        selectRows(identitySet(List.copyOf(chosen))::contains, true);
    }

    private void selectRows(Predicate<EObject> chosen, boolean scroll) {
        int[] wanted = IntStream.range(0, rows.length).filter(index -> chosen.test(rows[index])).toArray();
        int[] now = table.getSelectionIndices();
        Arrays.sort(now);
        if (Arrays.equals(now, wanted)) {
            return;
        }
        if (wanted.length == rows.length) {
            table.selectAll();
            return;
        }
        table.deselectAll();
        if (wanted.length > 0) {
            table.select(wanted);
            if (scroll) {
                table.showSelection();
            }
        }
    }

    /** The selected rows as text, or all if none is selected: tab-separated, with the headers, every digit. */
    String text() {
        List<EObject> chosen = table.getSelectionCount() == 0 ? List.of(rows) : selected();
        StringBuilder text = new StringBuilder(String.join("\t", labels(fields))).append('\n');
        for (EObject object : chosen) {
            text.append(String.join("\t", fields.stream().map(field -> field.text(object)).toList())).append('\n');
        }
        return text.toString();
    }

    /** The last column is empty: it takes the room that is left over, which numbers at the right of their column are not to do. */
    private void buildColumns() {
        table.setRedraw(false);
        try {
            table.setItemCount(0);
            rows = new EObject[0];
            for (TableColumn old : table.getColumns()) {
                old.dispose();
            }
            GC gc = new GC(table);
            try {
                for (int i = 0; i < fields.size(); i++) {
                    addColumn(i, gc);
                }
                TableColumn rest = new TableColumn(table, SWT.LEFT);
                rest.setResizable(false);
                rest.setWidth(REST);
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
        TableColumn added = new TableColumn(table, field.isNumber() ? SWT.RIGHT : SWT.LEFT);
        added.setText(field.label());
        added.setToolTipText(field.help());
        int width = gc.textExtent(field.label()).x + HEADER_ROOM;
        for (EObject object : objects.subList(0, Math.min(SAMPLE, objects.size()))) {
            int needed = gc.textExtent(cell(field, object)).x + CELL_ROOM + (index == 0 ? SIGN_ROOM : 0);
            width = Math.max(width, Math.min(MOST_WIDTH, needed));
        }
        added.setWidth(Math.max(LEAST_WIDTH, width));
        added.addListener(SWT.Selection, event -> sortBy(index));
    }

    private void sortBy(int newColumn) {
        descending = newColumn == sortedBy && !descending;
        sortedBy = newColumn;
        table.setSortColumn(table.getColumn(newColumn));
        table.setSortDirection(descending ? SWT.DOWN : SWT.UP);
        refresh();
    }

    private EObject[] sorted() {
        List<EObject> shown = new ArrayList<>(objects.size());
        for (EObject object : objects) {
            if (filter.isEmpty() || fields.stream().anyMatch(field -> field.text(object).toLowerCase(Locale.ROOT).contains(filter))) {
                shown.add(object);
            }
        }
        if (sortedBy >= 0) {
            Comparator<EObject> order = order(fields.get(sortedBy));
            shown.sort(descending ? order.reversed() : order);
        }
        return shown.toArray(new EObject[0]);
    }

    @SuppressWarnings("unchecked")
    private static Comparator<EObject> order(Field field) {
        if (!field.isNumber()) {
            return Comparator.comparing(field::text, new NaturalOrder());
        }
        return Comparator.comparing(object -> (Comparable<Object>) field.sortKey(object));
    }

    private static String cell(Field field, EObject object) {
        if (field.style() == Field.Style.FLAG) {
            return Boolean.parseBoolean(field.text(object)) ? "✓" : "";
        }
        return field.shown(object);
    }

    /** The platform asks for items while columns are made, when there is no row to fill. */
    private void fill(Event event) {
        if (event.index < 0 || event.index >= rows.length) {
            return;
        }
        EObject object = rows[event.index];
        TableItem item = (TableItem) event.item;
        for (int i = 0; i < fields.size(); i++) {
            item.setText(i, cell(fields.get(i), object));
        }
        List<Finding> findings = findings(object);
        item.setImage(0, findings.isEmpty() ? null : images.get(Images.descriptor(sign(findings.get(0).severity()))));
    }

    private List<Finding> findings(EObject object) {
        return object instanceof Identified identified ? context.findings(identified.getId()) : List.of();
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
        int at = item == null ? -1 : columnAt(item, event);
        String tip = row >= 0 && row < rows.length && at >= 0 ? tip(rows[row], at) : null;
        if (!Objects.equals(tip, table.getToolTipText())) {
            table.setToolTipText(tip);
        }
    }

    /** What the checks say about the object, or all digits of a number that is shown with fewer. */
    private String tip(EObject object, int at) {
        List<String> lines = new ArrayList<>();
        Field field = fields.get(at);
        if (field.isNumber() && !field.text(object).equals(field.shown(object))) {
            lines.add(field.text(object));
        }
        findings(object).forEach(finding -> lines.add(finding.text() + " " + finding.remedy()));
        return lines.isEmpty() ? null : String.join("\n", lines);
    }

    private int columnAt(TableItem item, Event event) {
        for (int i = 0; i < fields.size(); i++) {
            if (item.getBounds(i).contains(event.x, event.y)) {
                return i;
            }
        }
        return -1;
    }

    private void pointed(Event event) {
        TableItem item = table.getItem(new Point(event.x, event.y));
        int at = item == null ? -1 : columnAt(item, event);
        column = at < 0 ? column : at;
    }

    private void doubleClicked(Event event) {
        TableItem item = table.getItem(new Point(event.x, event.y));
        int at = item == null || event.button != 1 ? -1 : columnAt(item, event);
        if (at >= 0) {
            edit(table.indexOf(item), at, true);
        }
    }

    private void key(Event event) {
        boolean enter = event.keyCode == SWT.CR || event.keyCode == SWT.KEYPAD_CR;
        if (enter && event.stateMask == 0) {
            editCell();
            event.doit = false;
        }
    }

    /** Edits the name of the first selected row. */
    void editName() {
        column = 0;
        editCell();
    }

    /** Edits the cell of the first selected row in the column last pointed at, or the next one that can be edited. */
    void editCell() {
        int row = table.getSelectionIndex();
        int at = column;
        while (at < fields.size() && !fields.get(at).isEditable()) {
            at++;
        }
        edit(row, at, false);
    }

    private void edit(int row, int at, boolean byMouse) {
        if (row < 0 || row >= rows.length || at < 0 || at >= fields.size()) {
            return;
        }
        column = at;
        Field field = fields.get(at);
        EObject object = rows[row];
        if (!field.isEditable()) {
            return;
        }
        table.showColumn(table.getColumn(at));
        if (byMouse && field.style() == Field.Style.FLAG) {
            context.execute(field.set(List.of(object), Boolean.toString(!Boolean.parseBoolean(field.text(object)))));
            return;
        }
        editing.open(table.getItem(row), at, field, object, direction -> editNext(object, at, direction));
    }

    /** Goes on to the next cell of the object's row that can be edited. */
    private void editNext(EObject object, int at, int direction) {
        int row = IntStream.range(0, rows.length).filter(index -> rows[index] == object).findFirst().orElse(-1);
        int next = at + direction;
        while (next >= 0 && next < fields.size() && !fields.get(next).isEditable()) {
            next += direction;
        }
        edit(row, next, false);
    }
}
