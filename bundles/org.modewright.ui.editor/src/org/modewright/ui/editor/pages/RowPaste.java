package org.modewright.ui.editor.pages;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.eclipse.emf.common.command.Command;
import org.eclipse.emf.common.command.CompoundCommand;
import org.eclipse.emf.ecore.EReference;
import org.eclipse.osgi.util.NLS;
import org.modewright.model.structure.Identified;
import org.modewright.ui.editor.Messages;
import org.modewright.ui.editor.fields.Field;
import org.modewright.ui.editor.fields.FieldContext;
import org.modewright.ui.editor.fields.Fields;

/**
 * Rows from a spreadsheet as one command: a row whose name is there already changes that object, another makes a new one. The columns are
 * those of the table in order, or those that a first row of headers names. All or nothing.
 */
public final class RowPaste {

    private static final String UNNAMED = "\n";

    private final FieldContext context;
    private final EReference list;
    private final List<Field> fields;

    /** @param list the list of the model that gets the rows */
    public RowPaste(FieldContext context, EReference list) {
        this.context = context.forMany();
        this.list = list;
        fields = Fields.of(this.context, list.getEReferenceType(), null);
    }

    /**
     * The command that takes over the rows; null if the text holds none.
     *
     * @throws IllegalArgumentException if a cell is refused; the message names row, column and reason
     */
    public Command command(String text) {
        List<String[]> rows = Arrays.stream(text.split("\r\n|\n|\r")).filter(line -> !line.isBlank())
                .map(line -> line.split("\t", -1)).toList();
        if (rows.isEmpty()) {
            return null;
        }
        List<Field> columns = columns(rows.get(0));
        boolean headed = columns != null;
        List<String[]> data = headed ? rows.subList(1, rows.size()) : rows;
        return data.isEmpty() ? null : command(data, headed ? columns : fields, headed ? 2 : 1);
    }

    /** The fields that a row of headers names; null if it is no such row. */
    private List<Field> columns(String[] headers) {
        List<Field> columns = new ArrayList<>();
        for (String header : headers) {
            Field field = fields.stream().filter(any -> any.label().equals(header.strip())).findFirst().orElse(null);
            if (field == null) {
                return null;
            }
            columns.add(field);
        }
        return columns;
    }

    private Command command(List<String[]> rows, List<Field> columns, int firstRow) {
        int nameColumn = columns.indexOf(fields.get(0));
        List<Identified> created = new ArrayList<>();
        List<Identified> targets = targets(rows, nameColumn, created);
        CompoundCommand command = new Rows(NLS.bind(Messages.Tables_pasted, rows.size()));
        if (!created.isEmpty()) {
            command.append(context.commands().create(created));
        }
        for (int row = 0; row < rows.size(); row++) {
            appendCells(command, rows.get(row), columns, nameColumn, targets.get(row), firstRow + row);
        }
        return command;
    }

    /** The object of each row: the one of that name, or a new one. */
    private List<Identified> targets(List<String[]> rows, int nameColumn, List<Identified> created) {
        Map<String, Identified> byName = new HashMap<>();
        Tables.objects(context.model(), list).forEach(object -> byName.put(object.getName(), object));
        List<Identified> targets = new ArrayList<>();
        for (String[] row : rows) {
            String name = nameColumn >= 0 && nameColumn < row.length ? row[nameColumn].strip() : "";
            String key = name.isEmpty() ? UNNAMED + targets.size() : name;
            targets.add(byName.computeIfAbsent(key, absent -> {
                Identified target = Tables.create(context.model(), list);
                target.setName(name.isEmpty() ? null : name);
                created.add(target);
                return target;
            }));
        }
        return targets;
    }

    private static void appendCells(CompoundCommand command, String[] cells, List<Field> columns, int nameColumn, Identified target,
            int row) {
        for (int column = 0; column < Math.min(cells.length, columns.size()); column++) {
            if (column == nameColumn || cells[column].isBlank()) {
                continue;
            }
            Field field = columns.get(column);
            try {
                Command cell = field.set(List.of(target), value(field, cells[column]));
                if (cell.canExecute()) {
                    command.append(cell);
                }
            } catch (IllegalArgumentException refused) {
                throw new IllegalArgumentException(
                        NLS.bind(Messages.Tables_pasteFault, new Object[] {row, field.label(), refused.getMessage()}), refused);
            }
        }
    }

    /** A flag may be written as spreadsheets and tables write it. */
    private static String value(Field field, String cell) {
        String text = cell.strip();
        if (field.style() != Field.Style.FLAG) {
            return text;
        }
        return Boolean.toString(text.equals("1") || text.equals("✓") || text.equalsIgnoreCase("true") || text.equalsIgnoreCase("yes"));
    }

    /** A later step builds on the objects that the first one makes, so only the first is asked whether it can be executed. */
    private static final class Rows extends CompoundCommand {

        Rows(String label) {
            super(label);
        }

        @Override
        protected boolean prepare() {
            return !commandList.isEmpty() && commandList.get(0).canExecute();
        }
    }
}
