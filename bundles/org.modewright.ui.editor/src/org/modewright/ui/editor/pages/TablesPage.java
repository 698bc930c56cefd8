package org.modewright.ui.editor.pages;

import java.util.List;
import java.util.Set;
import org.eclipse.emf.common.command.Command;
import org.eclipse.emf.ecore.EReference;
import org.eclipse.jface.dialogs.MessageDialog;
import org.eclipse.osgi.util.NLS;
import org.eclipse.swt.SWT;
import org.eclipse.swt.custom.SashForm;
import org.eclipse.swt.dnd.Clipboard;
import org.eclipse.swt.dnd.TextTransfer;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.layout.GridLayout;
import org.eclipse.swt.widgets.Button;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swt.widgets.Event;
import org.eclipse.swt.widgets.Label;
import org.eclipse.swt.widgets.Text;
import org.modewright.model.structure.Identified;
import org.modewright.ui.UiIds;
import org.modewright.ui.editor.EditorContext;
import org.modewright.ui.editor.EditorPage;
import org.modewright.ui.editor.Messages;
import org.modewright.ui.editor.fields.Fields;
import org.modewright.ui.editor.fields.FeatureTexts;
import org.modewright.ui.widgets.TextCopy;
import org.modewright.ui.widgets.ThemeColours;

/** A table for each kind of object, with the properties of what is selected beside it. */
public final class TablesPage implements EditorPage {

    private final EditorContext context;
    private final SashForm parts;
    private final org.eclipse.swt.widgets.List kinds;
    private final List<EReference> lists = Tables.lists();
    private final ObjectTable table;
    private final Label hint;
    private final PropertyForm form;
    private EReference list;

    public TablesPage(Composite parent, EditorContext context) {
        this.context = context;
        parts = new SashForm(parent, SWT.HORIZONTAL);
        kinds = new org.eclipse.swt.widgets.List(parts, SWT.SINGLE | SWT.V_SCROLL);
        kinds.setData(UiIds.WIDGET_ID, "tables.kinds");
        kinds.addListener(SWT.Selection, event -> show(lists.get(kinds.getSelectionIndex())));
        Composite middle = new Composite(parts, SWT.NONE);
        GridLayout layout = new GridLayout();
        layout.marginWidth = 0;
        layout.marginHeight = 4;
        middle.setLayout(layout);
        createBar(middle);
        hint = new Label(middle, SWT.WRAP);
        hint.setForeground(ThemeColours.secondaryText(middle));
        GridData hintData = new GridData(SWT.FILL, SWT.TOP, true, false);
        hintData.horizontalIndent = 8;
        hint.setLayoutData(hintData);
        table = new ObjectTable(middle, context, this::rowsSelected);
        table.table().setLayoutData(new GridData(SWT.FILL, SWT.FILL, true, true));
        table.table().addListener(SWT.KeyDown, this::key);
        form = new PropertyForm(parts, context);
        parts.setWeights(16, 56, 28);
        show(lists.get(4));
    }

    private void createBar(Composite parent) {
        Composite bar = new Composite(parent, SWT.NONE);
        bar.setLayoutData(new GridData(SWT.FILL, SWT.TOP, true, false));
        GridLayout layout = new GridLayout(5, false);
        layout.marginHeight = 0;
        bar.setLayout(layout);
        button(bar, Messages.Tables_add, "tables.add", this::add);
        button(bar, Messages.Tables_duplicate, "tables.duplicate", () -> context.execute(context.commands().duplicate(table.selected(), 0, 0, 0)));
        button(bar, Messages.Tables_delete, "tables.delete", () -> context.delete(table.selected()));
        button(bar, Messages.Tables_paste, "tables.paste", this::paste);
        Text filter = new Text(bar, SWT.SEARCH | SWT.ICON_SEARCH | SWT.ICON_CANCEL);
        filter.setMessage(Messages.Tables_filter);
        filter.setData(UiIds.WIDGET_ID, "tables.filter");
        filter.setLayoutData(new GridData(SWT.FILL, SWT.CENTER, true, false));
        filter.addListener(SWT.Modify, event -> {
            table.filter(filter.getText());
            sayWhatIsMissing();
        });
    }

    private static void button(Composite bar, String label, String id, Runnable body) {
        Button button = new Button(bar, SWT.PUSH);
        button.setText(label);
        button.setData(UiIds.WIDGET_ID, id);
        button.addListener(SWT.Selection, event -> body.run());
    }

    private void show(EReference newList) {
        list = newList;
        table.show(Fields.of(context.fields(), list.getEReferenceType(), null), Tables.objects(context.model(), list));
        nameKinds();
        sayWhatIsMissing();
        table.select(context.session().selection().elementIds());
    }

    private void nameKinds() {
        String[] names = lists.stream().map(any -> FeatureTexts.label(any) + " (" + Tables.objects(context.model(), any).size() + ")")
                .toArray(String[]::new);
        if (!java.util.Arrays.equals(names, kinds.getItems())) {
            kinds.setItems(names);
        }
        kinds.select(lists.indexOf(list));
    }

    private void sayWhatIsMissing() {
        boolean none = Tables.objects(context.model(), list).isEmpty();
        String text = none ? NLS.bind(Messages.Tables_empty, FeatureTexts.label(list).toLowerCase(java.util.Locale.ROOT))
                : table.count() == 0 ? Messages.Tables_noMatch : "";
        hint.setText(text);
        ((GridData) hint.getLayoutData()).exclude = text.isEmpty();
        hint.setVisible(!text.isEmpty());
        hint.requestLayout();
    }

    private void add() {
        Identified created = Tables.create(context.model(), list);
        context.execute(context.commands().create(created));
        context.select(Set.of(created.getId()), this);
        modelChanged();
        table.select(Set.of(created.getId()));
        form.select(Set.of(created.getId()));
    }

    private void paste() {
        Clipboard clipboard = new Clipboard(parts.getDisplay());
        try {
            Object text = clipboard.getContents(TextTransfer.getInstance());
            if (text != null) {
                Command command = new RowPaste(context, list, Fields.of(context.fields(), list.getEReferenceType(), null)).command(text.toString());
                context.execute(command);
            }
        } catch (IllegalArgumentException refused) {
            MessageDialog.openError(context.shell(), Messages.Tables_paste, refused.getMessage());
        } finally {
            clipboard.dispose();
        }
    }

    private void key(Event event) {
        boolean command = (event.stateMask & SWT.MOD1) != 0;
        if (command && event.keyCode == 'v') {
            paste();
        } else if (event.keyCode == SWT.INSERT) {
            add();
        }
    }

    private void rowsSelected(Set<String> ids) {
        context.select(ids, this);
        form.select(ids);
    }

    @Override
    public String title() {
        return Messages.Page_tables;
    }

    @Override
    public Control control() {
        return parts;
    }

    @Override
    public void modelChanged() {
        nameKinds();
        table.refresh();
        sayWhatIsMissing();
        form.select(context.session().selection().elementIds());
    }

    @Override
    public void select(Set<String> ids) {
        EReference target = listOfAll(ids);
        if (target != null && target != list) {
            show(target);
        }
        table.select(ids);
        form.select(ids);
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
        return context.object(id) != null;
    }

    @Override
    public void setFocus() {
        table.table().setFocus();
    }

    @Override
    public void copy() {
        TextCopy.put(parts.getDisplay(), table.text());
    }

    @Override
    public void selectAll() {
        table.selectAll();
        rowsSelected(Set.copyOf(table.selected().stream().map(Identified::getId).toList()));
    }
}
