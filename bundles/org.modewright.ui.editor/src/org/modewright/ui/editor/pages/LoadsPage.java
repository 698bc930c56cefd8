package org.modewright.ui.editor.pages;

import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.osgi.util.NLS;
import org.eclipse.swt.SWT;
import org.eclipse.swt.custom.SashForm;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.layout.GridLayout;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swt.widgets.Label;
import org.eclipse.swt.widgets.ToolItem;
import org.modewright.model.structure.GravityLoad;
import org.modewright.model.structure.LoadPattern;
import org.modewright.model.structure.Member;
import org.modewright.model.structure.MemberLoad;
import org.modewright.model.structure.Node;
import org.modewright.model.structure.NodeLoad;
import org.modewright.model.structure.StructureFactory;
import org.modewright.model.structure.StructurePackage.Literals;
import org.modewright.ui.UiIds;
import org.modewright.ui.editor.EditorContext;
import org.modewright.ui.editor.EditorPage;
import org.modewright.ui.editor.Messages;
import org.modewright.ui.editor.fields.Fields;
import org.modewright.ui.editor.fields.LoadFields;
import org.modewright.ui.widgets.Images;
import org.modewright.ui.widgets.TextCopy;

/** Gravity load patterns, how they become mass, and the mass that results. */
public final class LoadsPage implements EditorPage {

    private final EditorContext context;
    private final SideBySide parts;
    private final ObjectTable patterns;
    private final ToolItem deletePattern;
    private final Label loadsTitle;
    private final ObjectTable loads;
    private final ToolItem addNodeLoad;
    private final ToolItem addMemberLoad;
    private final ToolItem duplicateLoad;
    private final ToolItem deleteLoad;
    private final PropertyForm form;
    private final MassTable masses;
    private final MassSum sum;
    private boolean formShowsLoads;

    public LoadsPage(Composite parent, EditorContext context) {
        this.context = context;
        parts = new SideBySide(parent, "loads", false);
        SashForm rows = new SashForm(parts.main(), SWT.VERTICAL);
        SashForm top = new SashForm(rows, SWT.HORIZONTAL);
        Composite left = section(top);
        Tools patternTools = tools(left, label(left, Messages.Loads_patterns));
        patternTools.add(Images.descriptor(Images.ADD), Messages.Loads_addPattern, "loads.addPattern", this::addPattern);
        deletePattern = patternTools.add(Images.descriptor(Images.DELETE), Messages.Loads_deletePattern, "loads.deletePattern",
                () -> context.delete(patterns().selected()));
        patterns = new ObjectTable(left, context, "loads.patterns", this::patternsSelected);
        fill(patterns.table());
        masses = new MassTable(section(top), context);
        top.setWeights(40, 60);
        Composite below = section(rows);
        loadsTitle = label(below, "");
        loadsTitle.setData(UiIds.WIDGET_ID, "loads.title");
        Tools loadTools = tools(below, loadsTitle);
        addNodeLoad = loadTools.add(Images.descriptor(Images.ADD), Messages.Loads_atNode, Messages.Loads_addNodeLoad, "loads.addNodeLoad",
                () -> addLoad(nodeLoad()));
        addMemberLoad = loadTools.add(Images.descriptor(Images.ADD), Messages.Loads_onMember, Messages.Loads_addMemberLoad,
                "loads.addMemberLoad", () -> addLoad(memberLoad()));
        duplicateLoad = loadTools.add(Tools.image("duplicate"), Messages.Tables_duplicate, "loads.duplicateLoad", this::duplicateLoads);
        deleteLoad = loadTools.add(Images.descriptor(Images.DELETE), Messages.Loads_delete, "loads.deleteLoad",
                () -> context.delete(loads().selected()));
        loads = new ObjectTable(below, context, "loads.loads", this::loadsSelected);
        fill(loads.table());
        rows.setWeights(50, 50);
        form = new PropertyForm(parts, context, Messages.Form_nothingInLoads);
        sum = new MassSum(rows.getDisplay(), masses::show);
        rows.addListener(SWT.Dispose, event -> sum.stop());
        modelChanged();
    }

    private ObjectTable patterns() {
        return patterns;
    }

    private ObjectTable loads() {
        return loads;
    }

    private static Composite section(Composite parent) {
        Composite section = new Composite(parent, SWT.NONE);
        GridLayout layout = new GridLayout(2, false);
        layout.marginWidth = 4;
        layout.marginHeight = 2;
        layout.verticalSpacing = 2;
        section.setLayout(layout);
        return section;
    }

    private static Label label(Composite parent, String text) {
        Label label = new Label(parent, SWT.NONE);
        label.setText(text);
        label.setLayoutData(new GridData(SWT.FILL, SWT.CENTER, true, false));
        return label;
    }

    private static Tools tools(Composite parent, Label after) {
        Tools tools = new Tools(parent);
        tools.bar().setLayoutData(new GridData(SWT.RIGHT, SWT.CENTER, false, false));
        tools.bar().moveBelow(after);
        return tools;
    }

    static void fill(Control table) {
        GridData data = new GridData(SWT.FILL, SWT.FILL, true, true, 2, 1);
        data.heightHint = 60;
        data.widthHint = 120;
        table.setLayoutData(data);
    }

    private LoadPattern pattern() {
        List<EObject> chosen = patterns.selected();
        return chosen.size() == 1 ? (LoadPattern) chosen.get(0) : null;
    }

    private void addPattern() {
        LoadPattern created = StructureFactory.eINSTANCE.createLoadPattern();
        context.execute(context.commands().create(created));
        modelChanged();
        patterns.select(List.of(created));
        patternsSelected(List.of(created));
        patterns.editName();
    }

    private <T> T selectedOr(Class<T> kind, List<T> all) {
        return context.selected().stream().filter(kind::isInstance).map(kind::cast).findFirst().orElseGet(() -> all.get(0));
    }

    private NodeLoad nodeLoad() {
        NodeLoad load = StructureFactory.eINSTANCE.createNodeLoad();
        load.setNode(selectedOr(Node.class, context.model().getNodes()));
        return load;
    }

    private MemberLoad memberLoad() {
        MemberLoad load = StructureFactory.eINSTANCE.createMemberLoad();
        load.setMember(selectedOr(Member.class, context.model().getMembers()));
        return load;
    }

    private void addLoad(GravityLoad load) {
        context.execute(context.commands().create(pattern(), load));
        modelChanged();
        loads.select(List.of(load));
        loadsSelected(List.of(load));
        loads.table().setFocus();
    }

    private void duplicateLoads() {
        int before = pattern().getLoads().size();
        context.execute(context.commands().duplicate(loads.selected(), 0, 0, 0));
        modelChanged();
        List<GravityLoad> copies = List.copyOf(pattern().getLoads().subList(before, pattern().getLoads().size()));
        loads.select(copies);
        loadsSelected(List.copyOf(copies));
    }

    private void patternsSelected(List<EObject> chosen) {
        Set<String> ids = new LinkedHashSet<>();
        chosen.forEach(object -> ids.add(((LoadPattern) object).getId()));
        formShowsLoads = false;
        context.select(ids, this);
        showLoads();
        showForm();
    }

    private void loadsSelected(List<EObject> chosen) {
        formShowsLoads = !chosen.isEmpty();
        showForm();
        enable();
    }

    private void showForm() {
        form.show(formShowsLoads ? loads.selected() : patterns.selected());
    }

    private void showLoads() {
        LoadPattern pattern = pattern();
        String title = pattern == null ? Messages.Loads_noPattern : NLS.bind(Messages.Loads_loads, pattern.getName());
        loadsTitle.setText(title.replace("&", "&&"));
        loads.show(LoadFields.all(context.fields()), pattern == null ? List.of() : pattern.getLoads());
        enable();
    }

    private void enable() {
        boolean one = pattern() != null;
        addNodeLoad.setEnabled(one && !context.model().getNodes().isEmpty());
        addMemberLoad.setEnabled(one && !context.model().getMembers().isEmpty());
        deletePattern.setEnabled(!patterns.selected().isEmpty());
        duplicateLoad.setEnabled(!loads.selected().isEmpty());
        deleteLoad.setEnabled(!loads.selected().isEmpty());
    }

    @Override
    public Control control() {
        return parts.body();
    }

    @Override
    public void modelChanged() {
        patterns.show(Fields.of(context.fields(), Literals.LOAD_PATTERN, null), context.model().getLoadPatterns());
        if (patterns.selected().isEmpty() && !context.model().getLoadPatterns().isEmpty()) {
            patterns.select(List.of(context.model().getLoadPatterns().get(0)));
        }
        showLoads();
        masses.modelChanged();
        showForm();
        sum.request(context.model());
    }

    @Override
    public void findingsChanged() {
        patterns.findingsChanged();
        form.findingsChanged();
    }

    @Override
    public void select(Set<String> ids) {
        if (ids.stream().anyMatch(id -> context.object(id) instanceof LoadPattern)) {
            patterns.select(ids);
            formShowsLoads = false;
            showLoads();
            showForm();
        }
    }

    @Override
    public boolean reveals(String id) {
        return context.object(id) instanceof LoadPattern;
    }

    @Override
    public void showProperties() {
        parts.open(true);
        form.setFocus();
    }

    @Override
    public void setFocus() {
        patterns.table().setFocus();
    }

    private ObjectTable focused() {
        return loads.table().isFocusControl() ? loads : patterns;
    }

    @Override
    public List<EObject> toDelete() {
        return focused().selected();
    }

    @Override
    public void rename() {
        focused().editCell();
    }

    @Override
    public void copy() {
        TextCopy.put(loads.table().getDisplay(), masses.hasFocus() ? masses.text() : focused().text());
    }

    @Override
    public void selectAll() {
        ObjectTable table = focused();
        table.selectAll();
        if (table == loads) {
            loadsSelected(loads.selected());
        } else {
            patternsSelected(patterns.selected());
        }
    }
}
