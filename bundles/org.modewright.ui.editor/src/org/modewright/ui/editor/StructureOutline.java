package org.modewright.ui.editor;

import java.net.URL;
import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Objects;
import java.util.Set;
import org.eclipse.emf.ecore.EReference;
import org.eclipse.emf.edit.provider.IItemLabelProvider;
import org.eclipse.jface.action.Action;
import org.eclipse.jface.resource.ImageDescriptor;
import org.eclipse.jface.resource.JFaceResources;
import org.eclipse.jface.resource.LocalResourceManager;
import org.eclipse.jface.viewers.DecorationOverlayIcon;
import org.eclipse.jface.viewers.IDecoration;
import org.eclipse.jface.viewers.ISelection;
import org.eclipse.jface.viewers.ISelectionChangedListener;
import org.eclipse.jface.viewers.StructuredSelection;
import org.eclipse.swt.SWT;
import org.eclipse.swt.custom.TreeEditor;
import org.eclipse.swt.graphics.Image;
import org.eclipse.swt.graphics.Point;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swt.widgets.Event;
import org.eclipse.swt.widgets.Text;
import org.eclipse.swt.widgets.Tree;
import org.eclipse.swt.widgets.TreeItem;
import org.eclipse.ui.IActionBars;
import org.eclipse.ui.ISharedImages;
import org.eclipse.ui.PlatformUI;
import org.eclipse.ui.actions.ActionFactory;
import org.eclipse.ui.part.Page;
import org.eclipse.ui.views.contentoutline.IContentOutlinePage;
import org.modewright.audit.Finding;
import org.modewright.model.edit.CategoryItemProvider;
import org.modewright.model.edit.Labels;
import org.modewright.model.structure.Identified;
import org.modewright.model.structure.StructurePackage;
import org.modewright.ui.UiIds;
import org.modewright.ui.widgets.TextCopy;
import org.modewright.ui.widgets.ThemeColours;

/** The model as a tree by kind; virtual, so that large models open at once. F2 renames, Delete deletes, a double click goes there. */
public final class StructureOutline extends Page implements IContentOutlinePage {

    private static final int MOST_SELECTED = 200;

    private final StructureEditor editor;
    private final List<CategoryItemProvider> categories = new ArrayList<>();
    private Tree tree;
    private LocalResourceManager images;
    private TreeEditor inPlace;

    StructureOutline(StructureEditor editor) {
        this.editor = editor;
    }

    @Override
    public void createControl(Composite parent) {
        tree = new Tree(parent, SWT.VIRTUAL | SWT.MULTI);
        tree.setData(UiIds.WIDGET_ID, "outline.tree");
        images = new LocalResourceManager(JFaceResources.getResources(), tree);
        inPlace = new TreeEditor(tree);
        inPlace.grabHorizontal = true;
        inPlace.horizontalAlignment = SWT.LEFT;
        tree.addListener(SWT.SetData, this::fill);
        tree.addListener(SWT.Selection, event -> picked());
        tree.addListener(SWT.DefaultSelection, this::opened);
        tree.addListener(SWT.MouseMove, this::explain);
        StructureMenu.offer(tree, getSite());
        contributeActions();
        modelChanged();
    }

    private void contributeActions() {
        IActionBars bars = getSite().getActionBars();
        editor.actions().contribute(bars);
        bars.setGlobalActionHandler(ActionFactory.DELETE.getId(), action(Messages.Delete, this::delete));
        bars.setGlobalActionHandler(ActionFactory.RENAME.getId(), action(Messages.Rename, this::rename));
        bars.setGlobalActionHandler(ActionFactory.COPY.getId(), action(Messages.Copy, this::copy));
        bars.setGlobalActionHandler(ActionFactory.CUT.getId(), action(Messages.Cut, this::cut));
        bars.setGlobalActionHandler(ActionFactory.PASTE.getId(), action(Messages.Paste, this::paste));
        bars.setGlobalActionHandler(ActionFactory.SELECT_ALL.getId(), action(Messages.SelectAll, this::selectAll));
        bars.updateActionBars();
    }

    private static Action action(String label, Runnable body) {
        return new Action(label) {
            @Override
            public void run() {
                body.run();
            }
        };
    }

    private void delete() {
        if (TextKeys.apply(tree.getDisplay())) {
            TextKeys.delete(tree.getDisplay());
        } else {
            editor.delete(chosen());
        }
    }

    private void copy() {
        if (TextKeys.apply(tree.getDisplay())) {
            TextKeys.copy(tree.getDisplay());
        } else if (!chosen().isEmpty()) {
            TextCopy.put(tree.getDisplay(), String.join("\n", chosen().stream().map(Labels::of).toList()));
        }
    }

    private void cut() {
        if (TextKeys.apply(tree.getDisplay())) {
            TextKeys.cut(tree.getDisplay());
        }
    }

    private void paste() {
        if (TextKeys.apply(tree.getDisplay())) {
            TextKeys.paste(tree.getDisplay());
        }
    }

    /** Selects all objects of the categories in which something is selected. */
    private void selectAll() {
        if (TextKeys.apply(tree.getDisplay())) {
            TextKeys.selectAll(tree.getDisplay());
            return;
        }
        Set<String> ids = new LinkedHashSet<>();
        for (TreeItem item : tree.getSelection()) {
            TreeItem category = item.getParentItem() == null ? item : item.getParentItem();
            categories.get(tree.indexOf(category)).objects().forEach(object -> ids.add(((Identified) object).getId()));
        }
        editor.select(ids, this);
        select(ids);
    }

    @Override
    public Control getControl() {
        return tree;
    }

    @Override
    public void setFocus() {
        tree.setFocus();
    }

    boolean isDisposed() {
        return tree != null && tree.isDisposed();
    }

    /** Shows the model anew. */
    void modelChanged() {
        if (tree == null || tree.isDisposed()) {
            return;
        }
        collectCategories();
        tree.setItemCount(categories.size());
        for (int i = 0; i < categories.size(); i++) {
            TreeItem item = tree.getItem(i);
            label(item, i);
            if (item.getExpanded()) {
                item.clearAll(false);
            }
        }
        select(editor.selectedIds());
    }

    /** Shows what the live checks say now. */
    void findingsChanged() {
        if (tree != null && !tree.isDisposed()) {
            for (TreeItem item : tree.getItems()) {
                if (item.getExpanded()) {
                    item.clearAll(false);
                }
            }
        }
    }

    private void collectCategories() {
        categories.clear();
        if (editor.model() == null) {
            return;
        }
        for (EReference list : StructurePackage.Literals.STRUCTURAL_MODEL.getEAllContainments()) {
            if (list.isMany()) {
                categories.add(editor.adapterFactory().category(editor.model(), list));
            }
        }
    }

    private void label(TreeItem item, int category) {
        CategoryItemProvider shown = categories.get(category);
        item.setText(shown.getText(shown));
        item.setImage(image(shown.getImage(shown), List.of()));
        if (item.getItemCount() != shown.objects().size()) {
            item.setItemCount(shown.objects().size());
        }
    }

    private void fill(Event event) {
        TreeItem item = (TreeItem) event.item;
        TreeItem parent = item.getParentItem();
        if (parent == null) {
            if (event.index >= 0 && event.index < categories.size()) {
                label(item, event.index);
            }
            return;
        }
        if (object(tree.indexOf(parent), event.index) instanceof Identified object) {
            IItemLabelProvider labels = (IItemLabelProvider) editor.adapterFactory().adapt(object, IItemLabelProvider.class);
            item.setText(Labels.of(object));
            item.setImage(image(labels.getImage(object), editor.findings(object.getId())));
        }
    }

    private Image image(Object address, List<Finding> findings) {
        if (!(address instanceof URL url)) {
            return null;
        }
        ImageDescriptor plain = ImageDescriptor.createFromURL(url);
        String sign = findings.isEmpty() ? null : switch (findings.get(0).severity()) {
            case ERROR -> ISharedImages.IMG_DEC_FIELD_ERROR;
            case WARNING -> ISharedImages.IMG_DEC_FIELD_WARNING;
            case INFO -> null;
        };
        if (sign == null) {
            return images.get(plain);
        }
        ImageDescriptor mark = PlatformUI.getWorkbench().getSharedImages().getImageDescriptor(sign);
        return images.get(new DecorationOverlayIcon(plain, mark, IDecoration.BOTTOM_RIGHT));
    }

    private void explain(Event event) {
        TreeItem item = tree.getItem(new Point(event.x, event.y));
        Identified object = item == null ? null : object(item);
        List<Finding> findings = object == null ? List.of() : editor.findings(object.getId());
        String tip = findings.isEmpty() ? null : findings.get(0).text() + " " + findings.get(0).remedy();
        if (!Objects.equals(tip, tree.getToolTipText())) {
            tree.setToolTipText(tip);
        }
    }

    private Object object(int category, int index) {
        if (category < 0 || category >= categories.size()) {
            return null;
        }
        List<?> objects = categories.get(category).objects();
        return index >= 0 && index < objects.size() ? objects.get(index) : null;
    }

    private Identified object(TreeItem item) {
        TreeItem parent = item.getParentItem();
        return parent == null ? null : (Identified) object(tree.indexOf(parent), parent.indexOf(item));
    }

    /** The objects of the selected items; those of a whole category where its item is selected. */
    private List<Identified> chosen() {
        List<Identified> objects = new ArrayList<>();
        for (TreeItem item : tree.getSelection()) {
            Identified object = object(item);
            if (object != null) {
                objects.add(object);
            }
        }
        return objects;
    }

    private void picked() {
        Set<String> ids = new LinkedHashSet<>();
        chosen().forEach(object -> ids.add(object.getId()));
        editor.select(ids, this);
    }

    private void opened(Event event) {
        Identified object = object((TreeItem) event.item);
        if (object == null) {
            ((TreeItem) event.item).setExpanded(!((TreeItem) event.item).getExpanded());
        } else {
            editor.session().revealProperties(object.getId());
        }
    }

    /** Selects the items of objects, without telling. */
    void select(Set<String> ids) {
        if (tree == null || tree.isDisposed()) {
            return;
        }
        List<TreeItem> items = new ArrayList<>();
        for (int category = 0; category < categories.size() && !ids.isEmpty(); category++) {
            List<?> objects = categories.get(category).objects();
            for (int index = 0; index < objects.size() && items.size() < MOST_SELECTED; index++) {
                if (ids.contains(((Identified) objects.get(index)).getId())) {
                    items.add(item(category, index));
                }
            }
        }
        tree.setSelection(items.toArray(new TreeItem[0]));
        if (!items.isEmpty()) {
            tree.showItem(items.get(0));
        }
    }

    private TreeItem item(int category, int index) {
        TreeItem parent = tree.getItem(category);
        if (parent.getItemCount() != categories.get(category).objects().size()) {
            label(parent, category);
        }
        return parent.getItem(index);
    }

    private void rename() {
        if (TextKeys.apply(tree.getDisplay())) {
            return;
        }
        TreeItem[] selection = tree.getSelection();
        Identified object = selection.length == 1 ? object(selection[0]) : null;
        if (object == null) {
            return;
        }
        Text text = new Text(tree, SWT.BORDER);
        text.setText(object.getName() == null ? "" : object.getName());
        text.selectAll();
        text.setData(UiIds.WIDGET_ID, "outline.rename");
        text.addListener(SWT.FocusOut, event -> text.dispose());
        text.addListener(SWT.Traverse, event -> {
            if (event.detail == SWT.TRAVERSE_RETURN) {
                event.doit = false;
                rename(object, text);
            } else if (event.detail == SWT.TRAVERSE_ESCAPE) {
                event.doit = false;
                text.dispose();
            }
        });
        inPlace.setEditor(text, selection[0]);
        text.setFocus();
    }

    private void rename(Identified object, Text text) {
        try {
            editor.execute(editor.commands().rename(object, text.getText()));
            text.dispose();
        } catch (IllegalArgumentException refused) {
            text.setToolTipText(refused.getMessage());
            text.setForeground(ThemeColours.failed(text));
        }
    }

    @Override
    public void addSelectionChangedListener(ISelectionChangedListener listener) {
        editor.getSite().getSelectionProvider().addSelectionChangedListener(listener);
    }

    @Override
    public void removeSelectionChangedListener(ISelectionChangedListener listener) {
        editor.getSite().getSelectionProvider().removeSelectionChangedListener(listener);
    }

    @Override
    public ISelection getSelection() {
        return tree == null || tree.isDisposed() ? StructuredSelection.EMPTY : new StructuredSelection(chosen());
    }

    @Override
    public void setSelection(ISelection selection) {
        // The session says what is selected.
    }
}
