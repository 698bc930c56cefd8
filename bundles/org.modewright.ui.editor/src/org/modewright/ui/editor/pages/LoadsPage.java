package org.modewright.ui.editor.pages;

import java.util.List;
import java.util.Set;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.osgi.util.NLS;
import org.eclipse.swt.SWT;
import org.eclipse.swt.custom.SashForm;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.layout.GridLayout;
import org.eclipse.swt.widgets.Button;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swt.widgets.Group;
import org.eclipse.swt.widgets.Label;
import org.eclipse.swt.widgets.Table;
import org.eclipse.swt.widgets.TableColumn;
import org.eclipse.swt.widgets.TableItem;
import org.modewright.fem.MassLedger;
import org.modewright.fem.MassSource;
import org.modewright.model.Quantity;
import org.modewright.model.Units;
import org.modewright.model.structure.GravityLoad;
import org.modewright.model.structure.Identified;
import org.modewright.model.structure.LoadPattern;
import org.modewright.model.structure.MemberLoad;
import org.modewright.model.structure.NodeLoad;
import org.modewright.model.structure.StructureFactory;
import org.modewright.model.structure.StructurePackage;
import org.modewright.ui.UiIds;
import org.modewright.ui.editor.EditorContext;
import org.modewright.ui.editor.EditorPage;
import org.modewright.ui.editor.Messages;
import org.modewright.ui.editor.fields.Field;
import org.modewright.ui.editor.fields.Fields;
import org.modewright.ui.widgets.Numbers;

/** Gravity load patterns, how they become mass, and the mass that results. */
public final class LoadsPage implements EditorPage {

    private final EditorContext context;
    private final SashForm body;
    private final ObjectTable patterns;
    private final Label loadsTitle;
    private final Table loads;
    private final Button addNodeLoad;
    private final Button addMemberLoad;
    private final PropertyForm form;
    private final Label massNote;
    private final Table masses;
    private final FieldControl selfMass;
    private final MassSum sum;
    private List<GravityLoad> shownLoads = List.of();

    public LoadsPage(Composite parent, EditorContext context) {
        this.context = context;
        body = new SashForm(parent, SWT.HORIZONTAL);
        SashForm left = new SashForm(body, SWT.VERTICAL);
        Composite top = group(left, Messages.Loads_patterns, 3);
        button(top, Messages.Loads_addPattern, "loads.addPattern", this::addPattern);
        button(top, Messages.Loads_delete, "loads.deletePattern", this::deletePatterns);
        new Label(top, SWT.NONE);
        patterns = new ObjectTable(top, context, this::patternSelected);
        fill(patterns.table(), 3);
        Composite below = group(left, Messages.Loads_loads, 3);
        loadsTitle = new Label(below, SWT.NONE);
        loadsTitle.setLayoutData(new GridData(SWT.FILL, SWT.CENTER, true, false, 3, 1));
        addNodeLoad = button(below, Messages.Loads_addNodeLoad, "loads.addNodeLoad", () -> addLoad(nodeLoad()));
        addMemberLoad = button(below, Messages.Loads_addMemberLoad, "loads.addMemberLoad", () -> addLoad(memberLoad()));
        button(below, Messages.Loads_delete, "loads.deleteLoad", () -> context.delete(selectedLoads()));
        loads = table(below, 3, Messages.Loads_kind, Messages.Loads_target, Messages.Loads_value);
        loads.setData(UiIds.WIDGET_ID, "loads.loads");
        loads.addListener(SWT.Selection, event -> showForm(selectedLoads()));
        left.setWeights(45, 55);
        SashForm right = new SashForm(body, SWT.VERTICAL);
        form = new PropertyForm(right, context);
        Composite mass = group(right, Messages.Loads_massTitle, 2);
        selfMass = FieldControl.create(mass, Fields.one(context.fields(), context.model(), StructurePackage.Literals.STRUCTURAL_MODEL__SELF_MASS_FACTOR),
                context);
        massNote = new Label(mass, SWT.WRAP);
        massNote.setLayoutData(new GridData(SWT.FILL, SWT.TOP, true, false, 2, 1));
        masses = table(mass, 2, Messages.Loads_source, "X", "Y", "Z");
        masses.setData(UiIds.WIDGET_ID, "loads.masses");
        right.setWeights(45, 55);
        body.setWeights(58, 42);
        sum = new MassSum(body.getDisplay(), this::showMass);
        body.addListener(SWT.Dispose, event -> sum.cancel());
        patterns.show(patternFields(), context.model().getLoadPatterns());
        modelChanged();
    }

    private List<Field> patternFields() {
        return Fields.of(context.fields(), StructurePackage.Literals.LOAD_PATTERN, null);
    }

    private static Composite group(Composite parent, String title, int columns) {
        Group group = new Group(parent, SWT.NONE);
        group.setText(title.replace("{0}", "").strip());
        group.setLayout(new GridLayout(columns, false));
        return group;
    }

    private static Button button(Composite parent, String label, String id, Runnable act) {
        Button button = new Button(parent, SWT.PUSH);
        button.setText(label);
        button.setData(UiIds.WIDGET_ID, id);
        button.addListener(SWT.Selection, event -> act.run());
        return button;
    }

    private static Table table(Composite parent, int span, String... headers) {
        Table table = new Table(parent, SWT.FULL_SELECTION | SWT.MULTI | SWT.BORDER | (headers.length == 3 ? SWT.VIRTUAL : SWT.NONE));
        table.setHeaderVisible(true);
        for (int i = 0; i < headers.length; i++) {
            TableColumn column = new TableColumn(table, i == 0 || i == 1 && headers.length == 3 ? SWT.LEFT : SWT.RIGHT);
            column.setText(headers[i]);
            column.setWidth(104);
        }
        fill(table, span);
        return table;
    }

    private static void fill(Table table, int span) {
        GridData data = new GridData(SWT.FILL, SWT.FILL, true, true, span, 1);
        data.heightHint = 80;
        table.setLayoutData(data);
    }

    private LoadPattern pattern() {
        List<Identified> chosen = patterns.selected();
        return chosen.size() == 1 ? (LoadPattern) chosen.get(0) : null;
    }

    private void addPattern() {
        LoadPattern created = StructureFactory.eINSTANCE.createLoadPattern();
        context.execute(context.commands().create(created));
        modelChanged();
        patterns.select(Set.of(created.getId()));
        patternSelected(Set.of(created.getId()));
    }

    private void deletePatterns() {
        context.delete(patterns.selected());
    }

    private NodeLoad nodeLoad() {
        NodeLoad load = StructureFactory.eINSTANCE.createNodeLoad();
        load.setNode(context.selected().stream().filter(org.modewright.model.structure.Node.class::isInstance)
                .map(org.modewright.model.structure.Node.class::cast).findFirst()
                .orElseGet(() -> context.model().getNodes().stream().findFirst().orElse(null)));
        return load;
    }

    private MemberLoad memberLoad() {
        MemberLoad load = StructureFactory.eINSTANCE.createMemberLoad();
        load.setMember(context.selected().stream().filter(org.modewright.model.structure.Member.class::isInstance)
                .map(org.modewright.model.structure.Member.class::cast).findFirst()
                .orElseGet(() -> context.model().getMembers().stream().findFirst().orElse(null)));
        return load;
    }

    private void addLoad(GravityLoad load) {
        LoadPattern pattern = pattern();
        if (pattern != null) {
            context.execute(context.commands().create(pattern, load));
            modelChanged();
            int row = shownLoads.indexOf(load);
            if (row >= 0) {
                loads.setSelection(row);
                showForm(List.of(load));
            }
        }
    }

    private List<GravityLoad> selectedLoads() {
        return java.util.Arrays.stream(loads.getSelectionIndices()).filter(row -> row < shownLoads.size()).mapToObj(shownLoads::get).toList();
    }

    private void patternSelected(Set<String> ids) {
        context.select(ids, this);
        showLoads();
        showForm(patterns.selected());
    }

    private void showForm(List<? extends EObject> objects) {
        form.show(objects);
    }

    private void showLoads() {
        LoadPattern pattern = pattern();
        shownLoads = pattern == null ? List.of() : List.copyOf(pattern.getLoads());
        loadsTitle.setText(pattern == null ? Messages.Loads_noPattern : NLS.bind(Messages.Loads_loads, pattern.getName()).replace("&", "&&"));
        addNodeLoad.setEnabled(pattern != null && !context.model().getNodes().isEmpty());
        addMemberLoad.setEnabled(pattern != null && !context.model().getMembers().isEmpty());
        if (loads.getListeners(SWT.SetData).length == 0) {
            loads.addListener(SWT.SetData, event -> fillLoad((TableItem) event.item, event.index));
        }
        loads.setItemCount(shownLoads.size());
        loads.clearAll();
    }

    private void fillLoad(TableItem item, int row) {
        if (row >= shownLoads.size()) {
            return;
        }
        GravityLoad load = shownLoads.get(row);
        boolean onNode = load instanceof NodeLoad;
        Identified target = load instanceof NodeLoad node ? node.getNode() : ((MemberLoad) load).getMember();
        String unit = Units.of(context.model()).symbol(onNode ? Quantity.FORCE : Quantity.FORCE_PER_LENGTH);
        item.setText(new String[] {onNode ? Messages.Loads_kindNode : Messages.Loads_kindMember, target == null ? "?" : target.getName(),
            Numbers.significant(load.getValue()) + " " + unit});
    }

    private void showMass(MassLedger ledger) {
        if (masses.isDisposed()) {
            return;
        }
        masses.removeAll();
        massNote.setText(ledger == null ? Messages.Loads_notComputable : "");
        ((GridData) massNote.getLayoutData()).exclude = ledger != null;
        massNote.setVisible(ledger == null);
        massNote.requestLayout();
        if (ledger == null) {
            return;
        }
        Units units = Units.of(context.model());
        String symbol = units.symbol(Quantity.MASS);
        for (int axis = 0; axis < 3; axis++) {
            masses.getColumn(1 + axis).setText("XYZ".charAt(axis) + " " + symbol);
        }
        for (MassSource source : ledger.sources()) {
            addMass(source.name(), source.movable(), source.onSupports(), units.mass());
        }
        addMass(Messages.Loads_total, ledger.movable(), ledger.onSupports(), units.mass());
    }

    private void addMass(String name, double[] movable, double[] onSupports, double unit) {
        TableItem item = new TableItem(masses, SWT.NONE);
        item.setText(0, name);
        for (int axis = 0; axis < 3; axis++) {
            item.setText(1 + axis, Numbers.significant((movable[axis] + onSupports[axis]) / unit));
        }
    }

    @Override
    public String title() {
        return Messages.Page_loads;
    }

    @Override
    public Control control() {
        return body;
    }

    @Override
    public void modelChanged() {
        patterns.refresh();
        showLoads();
        selfMass.show(List.of(context.model()));
        List<GravityLoad> chosen = selectedLoads();
        showForm(chosen.isEmpty() ? patterns.selected() : chosen);
        sum.request(context.model());
    }

    @Override
    public void select(Set<String> ids) {
        patterns.select(ids);
        showLoads();
    }

    @Override
    public boolean reveals(String id) {
        return context.object(id) instanceof LoadPattern;
    }

    @Override
    public void setFocus() {
        patterns.table().setFocus();
    }
}
