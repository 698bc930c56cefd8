package org.modewright.ui.editor.pages;

import java.util.List;
import org.eclipse.swt.SWT;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.layout.GridLayout;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Label;
import org.eclipse.swt.widgets.Table;
import org.eclipse.swt.widgets.TableColumn;
import org.eclipse.swt.widgets.TableItem;
import org.modewright.fem.MassLedger;
import org.modewright.fem.MassSource;
import org.modewright.model.Quantity;
import org.modewright.model.Units;
import org.modewright.model.structure.StructurePackage.Literals;
import org.modewright.ui.UiIds;
import org.modewright.ui.editor.EditorContext;
import org.modewright.ui.editor.Messages;
import org.modewright.ui.editor.fields.Field;
import org.modewright.ui.editor.fields.Fields;
import org.modewright.ui.widgets.Numbers;

/** The seismic mass by source and direction, with the factor of the elements' own mass above it. */
final class MassTable {

    private static final String AXES = "XYZ";
    private static final int SOURCE_WIDTH = 84;
    private static final int MASS_WIDTH = 64;
    private static final int FACTOR_WIDTH = 184;

    private final EditorContext context;
    private final Label title;
    private final Table table;
    private final FieldControl selfMass;

    MassTable(Composite parent, EditorContext context) {
        this.context = context;
        title = new Label(parent, SWT.NONE);
        title.setData(UiIds.WIDGET_ID, "loads.massNote");
        title.setLayoutData(new GridData(SWT.FILL, SWT.CENTER, true, false));
        Composite factor = new Composite(parent, SWT.NONE);
        GridData beside = new GridData(SWT.FILL, SWT.CENTER, false, false);
        beside.widthHint = FACTOR_WIDTH;
        factor.setLayoutData(beside);
        GridLayout layout = new GridLayout(2, false);
        layout.marginWidth = 0;
        layout.marginHeight = 0;
        factor.setLayout(layout);
        Field selfMassFactor = Fields.one(context.fields(), context.model(), Literals.STRUCTURAL_MODEL__SELF_MASS_FACTOR);
        selfMass = FieldControl.create(factor, selfMassFactor, context);
        table = new Table(parent, SWT.FULL_SELECTION | SWT.MULTI | SWT.BORDER);
        table.setHeaderVisible(true);
        table.setData(UiIds.WIDGET_ID, "loads.masses");
        LoadsPage.fill(table);
        new TableColumn(table, SWT.LEFT).setText(Messages.Loads_source);
        table.getColumn(0).setWidth(SOURCE_WIDTH);
        for (int axis = 0; axis < AXES.length(); axis++) {
            TableColumn column = new TableColumn(table, SWT.RIGHT);
            column.setText(AXES.substring(axis, axis + 1));
            column.setToolTipText(Messages.Loads_massHelp);
            column.setWidth(MASS_WIDTH);
        }
        title.setText(Messages.Loads_working);
    }

    void modelChanged() {
        selfMass.show(List.of(context.model()));
    }

    /** Shows the masses; null: the model cannot be computed. */
    void show(MassLedger ledger) {
        if (table.isDisposed()) {
            return;
        }
        table.removeAll();
        Units units = Units.of(context.model());
        title.setText(ledger == null ? Messages.Loads_notComputable : Messages.Loads_massTitle + " (" + units.symbol(Quantity.MASS) + ")");
        title.setToolTipText(title.getText());
        if (ledger == null) {
            return;
        }
        for (MassSource source : ledger.sources()) {
            add(source.name(), source.movable(), source.onSupports(), units.mass());
        }
        add(Messages.Loads_total, ledger.movable(), ledger.onSupports(), units.mass());
    }

    private void add(String name, double[] movable, double[] onSupports, double unit) {
        TableItem item = new TableItem(table, SWT.NONE);
        item.setText(0, name);
        for (int axis = 0; axis < AXES.length(); axis++) {
            item.setText(1 + axis, Numbers.significant((movable[axis] + onSupports[axis]) / unit));
        }
    }

    boolean hasFocus() {
        return table.isFocusControl();
    }

    /** The table as text, tab-separated, with the headers. */
    String text() {
        StringBuilder text = new StringBuilder(String.join("\t", Messages.Loads_source, "X", "Y", "Z")).append('\n');
        for (TableItem item : table.getItems()) {
            text.append(String.join("\t", item.getText(0), item.getText(1), item.getText(2), item.getText(3))).append('\n');
        }
        return text.toString();
    }
}
