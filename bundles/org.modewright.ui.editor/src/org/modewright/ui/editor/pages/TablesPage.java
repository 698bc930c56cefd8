package org.modewright.ui.editor.pages;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Locale;
import java.util.Set;
import org.eclipse.emf.common.command.Command;
import org.eclipse.emf.ecore.EClass;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.ecore.EReference;
import org.eclipse.jface.dialogs.MessageDialog;
import org.eclipse.osgi.util.NLS;
import org.eclipse.swt.SWT;
import org.eclipse.swt.dnd.Clipboard;
import org.eclipse.swt.dnd.TextTransfer;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.layout.GridLayout;
import org.eclipse.swt.widgets.Combo;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swt.widgets.Event;
import org.eclipse.swt.widgets.Label;
import org.eclipse.swt.widgets.Text;
import org.eclipse.swt.widgets.ToolItem;
import org.modewright.model.structure.Identified;
import org.modewright.model.structure.StructurePackage.Literals;
import org.modewright.ui.UiIds;
import org.modewright.ui.editor.EditorContext;
import org.modewright.ui.editor.EditorPage;
import org.modewright.ui.editor.Messages;
import org.modewright.ui.editor.fields.FeatureTexts;
import org.modewright.ui.editor.fields.Fields;
import org.modewright.ui.widgets.Images;
import org.modewright.ui.widgets.TextCopy;
import org.modewright.ui.widgets.ThemeColours;

/** A table for each kind of object, with the properties of what is selected beside it. */
public final class TablesPage implements EditorPage {

    private static final int NARROW = 400;
    private static final int KINDS = 100;

    private final EditorContext context;
    private final SideBySide parts;
    private final List<EReference> lists = Tables.lists();
    private final Combo kinds;
    private final Text filter;
    private final ToolItem duplicate;
    private final ToolItem delete;
    private final ObjectTable table;
    private final Label hint;
    private final PropertyForm form;
    private EReference list;

    public TablesPage(Composite parent, EditorContext context) {
        this.context = context;
        parts = new SideBySide(parent, "tables", false);
        Composite middle = new Composite(parts.main(), SWT.NONE);
        GridLayout layout = new GridLayout();
        layout.marginWidth = 0;
        layout.marginHeight = 0;
        layout.verticalSpacing = 4;
        middle.setLayout(layout);
        Composite bar = bar(middle);
        kinds = kinds(bar);
        Tools tools = new Tools(bar);
        tools.add(Images.descriptor(Images.ADD), Messages.Tables_add, "tables.add", this::add);
        duplicate = tools.add(Tools.image("duplicate"), Messages.Tables_duplicate, "tables.duplicate", this::duplicate);
        delete = tools.add(Images.descriptor(Images.DELETE), Messages.Tables_delete, "tables.delete",
                () -> context.delete(table().selected()));
        tools.add(Images.descriptor(Images.COPY), Messages.Tables_copy, "tables.copy", this::copy);
        tools.add(Tools.image("paste"), Messages.Tables_paste, "tables.paste", this::paste);
        filter = filter(bar);
        bar.addListener(SWT.Resize, event -> arrange(bar));
        hint = new Label(middle, SWT.WRAP);
        hint.setForeground(ThemeColours.secondaryText(middle));
        hint.setData(UiIds.WIDGET_ID, "tables.hint");
        GridData hintData = new GridData(SWT.FILL, SWT.TOP, true, false);
        hintData.horizontalIndent = 8;
        hintData.widthHint = 120;
        hint.setLayoutData(hintData);
        table = new ObjectTable(middle, context, "tables.table", this::rowsSelected);
        table.table().setLayoutData(new GridData(SWT.FILL, SWT.FILL, true, true));
        table.table().addListener(SWT.KeyDown, this::key);
        context.offerMenu(table.table());
        form = new PropertyForm(parts, context, Messages.Form_nothingInTable);
        show(Literals.STRUCTURAL_MODEL__NODES);
    }

    private ObjectTable table() {
        return table;
    }

    private static Composite bar(Composite parent) {
        Composite bar = new Composite(parent, SWT.NONE);
        bar.setLayoutData(new GridData(SWT.FILL, SWT.TOP, true, false));
        GridLayout layout = new GridLayout(3, false);
        layout.marginHeight = 0;
        layout.marginWidth = 4;
        bar.setLayout(layout);
        return bar;
    }

    /** The filter goes below the acts where there is no room beside them. */
    private void arrange(Composite bar) {
        GridLayout layout = (GridLayout) bar.getLayout();
        int columns = bar.getSize().x < NARROW ? 2 : 3;
        if (layout.numColumns != columns) {
            boolean narrow = columns == 2;
            layout.numColumns = columns;
            ((GridData) filter.getLayoutData()).horizontalSpan = narrow ? 2 : 1;
            ((GridData) kinds.getLayoutData()).widthHint = narrow ? KINDS : SWT.DEFAULT;
            ((GridData) kinds.getLayoutData()).grabExcessHorizontalSpace = narrow;
            filter.requestLayout();
        }
    }

    private Combo kinds(Composite bar) {
        Combo combo = new Combo(bar, SWT.READ_ONLY);
        combo.setVisibleItemCount(lists.size());
        combo.setToolTipText(Messages.Tables_kinds);
        combo.setData(UiIds.WIDGET_ID, "tables.kinds");
        combo.setLayoutData(new GridData(SWT.FILL, SWT.CENTER, false, false));
        combo.addListener(SWT.Selection, event -> showKind(lists.get(combo.getSelectionIndex())));
        return combo;
    }

    private Text filter(Composite bar) {
        Text text = new Text(bar, SWT.SEARCH | SWT.ICON_SEARCH | SWT.ICON_CANCEL);
        text.setMessage(Messages.Tables_filter);
        text.setData(UiIds.WIDGET_ID, "tables.filter");
        GridData data = new GridData(SWT.FILL, SWT.CENTER, true, false);
        data.widthHint = 80;
        text.setLayoutData(data);
        text.addListener(SWT.Modify, event -> {
            table.filter(text.getText());
            sayWhatIsMissing();
        });
        text.addListener(SWT.KeyDown, event -> {
            if (event.keyCode == SWT.ESC && !text.getText().isEmpty()) {
                text.setText("");
                event.doit = false;
            } else if (event.keyCode == SWT.ARROW_DOWN) {
                table.table().setFocus();
                event.doit = false;
            }
        });
        return text;
    }

    private void show(EReference newList) {
        list = newList;
        table.show(Fields.of(context.fields(), list.getEReferenceType(), null), Tables.objects(context.model(), list));
        nameKinds();
        sayWhatIsMissing();
        table.select(context.session().selection().elementIds());
        enable();
    }

    /** What is selected and does not stand in the table is not kept, so that no command works on what is out of sight. */
    private void showKind(EReference newList) {
        show(newList);
        rowsSelected(table.selected());
    }

    private void nameKinds() {
        String[] names = lists.stream().map(any -> FeatureTexts.label(any) + " (" + Tables.objects(context.model(), any).size() + ")")
                .toArray(String[]::new);
        if (!Arrays.equals(names, kinds.getItems())) {
            kinds.setItems(names);
            kinds.requestLayout();
        }
        kinds.select(lists.indexOf(list));
    }

    private void sayWhatIsMissing() {
        boolean none = Tables.objects(context.model(), list).isEmpty();
        String text = none ? NLS.bind(Messages.Tables_empty, FeatureTexts.label(list).toLowerCase(Locale.ROOT))
                : table.count() == 0 ? Messages.Tables_noMatch : "";
        if (text.equals(hint.getText()) && ((GridData) hint.getLayoutData()).exclude == text.isEmpty()) {
            return;
        }
        hint.setText(text);
        ((GridData) hint.getLayoutData()).exclude = text.isEmpty();
        hint.setVisible(!text.isEmpty());
        hint.requestLayout();
    }

    private void enable() {
        boolean some = table.table().getSelectionCount() > 0;
        duplicate.setEnabled(some);
        delete.setEnabled(some);
    }

    private void add() {
        filter.setText("");
        Identified created = Tables.create(context.model(), list);
        context.execute(context.commands().create(created));
        modelChanged();
        selectHere(Set.of(created.getId()));
        table.editName();
    }

    private void duplicate() {
        Command command = context.commands().duplicate(table.selected(), 0, 0, 0);
        EClass kind = list.getEReferenceType();
        context.execute(command);
        filter.setText("");
        modelChanged();
        Set<String> copies = new LinkedHashSet<>();
        for (Object copy : command.getResult()) {
            if (copy instanceof Identified identified && kind.isInstance(identified)) {
                copies.add(identified.getId());
            }
        }
        selectHere(copies);
    }

    private void selectHere(Set<String> ids) {
        context.select(ids, this);
        table.select(ids);
        form.select(ids);
        enable();
    }

    @Override
    public void paste() {
        Clipboard clipboard = new Clipboard(table.table().getDisplay());
        try {
            Object text = clipboard.getContents(TextTransfer.getInstance());
            if (text != null) {
                context.execute(new RowPaste(context.fields(), list).command(text.toString()));
            }
        } catch (IllegalArgumentException refused) {
            MessageDialog.openError(context.shell(), Messages.Tables_paste, refused.getMessage());
        } finally {
            clipboard.dispose();
        }
    }

    private void key(Event event) {
        if (event.keyCode == SWT.INSERT) {
            add();
        }
    }

    private void rowsSelected(List<EObject> objects) {
        Set<String> ids = new LinkedHashSet<>();
        objects.forEach(object -> ids.add(((Identified) object).getId()));
        context.select(ids, this);
        form.show(objects);
        enable();
    }

    @Override
    public Control control() {
        return parts.body();
    }

    @Override
    public void modelChanged() {
        nameKinds();
        table.show(Fields.of(context.fields(), list.getEReferenceType(), null), Tables.objects(context.model(), list));
        sayWhatIsMissing();
        form.select(context.session().selection().elementIds());
        enable();
    }

    @Override
    public void findingsChanged() {
        table.findingsChanged();
        form.findingsChanged();
    }

    @Override
    public void select(Set<String> ids) {
        EReference target = listOfAll(ids);
        if (target != null && target != list) {
            show(target);
        }
        table.select(ids);
        form.select(ids);
        enable();
    }

    /** The list in which all selected objects stand; null if they stand in several. */
    private EReference listOfAll(Set<String> ids) {
        EReference common = null;
        for (String id : ids) {
            Identified object = context.object(id);
            EReference own = object == null ? null : Tables.listOf(object);
            if (own != null && lists.contains(own)) {
                if (common != null && common != own) {
                    return null;
                }
                common = own;
            }
        }
        return common;
    }

    @Override
    public boolean reveals(String id) {
        Identified object = context.object(id);
        return object != null && lists.contains(Tables.listOf(object));
    }

    @Override
    public void showProperties() {
        parts.open(true);
        form.setFocus();
    }

    @Override
    public List<? extends EObject> toDelete() {
        return table.selected();
    }

    @Override
    public void rename() {
        table.editName();
    }

    @Override
    public void find() {
        filter.setFocus();
        filter.selectAll();
    }

    @Override
    public void setFocus() {
        table.table().setFocus();
    }

    @Override
    public void copy() {
        TextCopy.put(table.table().getDisplay(), table.text());
    }

    @Override
    public void selectAll() {
        table.selectAll();
        rowsSelected(new ArrayList<>(table.selected()));
    }
}
