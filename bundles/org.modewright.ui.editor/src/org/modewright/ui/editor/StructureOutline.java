package org.modewright.ui.editor;

import java.net.URL;
import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import org.eclipse.emf.ecore.EReference;
import org.eclipse.emf.edit.provider.IItemLabelProvider;
import org.eclipse.jface.resource.ImageDescriptor;
import org.eclipse.jface.resource.JFaceResources;
import org.eclipse.jface.resource.LocalResourceManager;
import org.eclipse.jface.viewers.ISelection;
import org.eclipse.jface.viewers.ISelectionChangedListener;
import org.eclipse.jface.viewers.StructuredSelection;
import org.eclipse.jface.action.Action;
import org.eclipse.jface.action.MenuManager;
import org.eclipse.swt.SWT;
import org.eclipse.swt.custom.TreeEditor;
import org.eclipse.swt.graphics.Image;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swt.widgets.Event;
import org.eclipse.swt.widgets.Text;
import org.eclipse.swt.widgets.Tree;
import org.eclipse.swt.widgets.TreeItem;
import org.eclipse.ui.actions.ActionFactory;
import org.eclipse.ui.part.Page;
import org.eclipse.ui.views.contentoutline.IContentOutlinePage;
import org.modewright.model.edit.CategoryItemProvider;
import org.modewright.model.edit.Labels;
import org.modewright.model.edit.StructureEditAdapterFactory;
import org.modewright.model.structure.Identified;
import org.modewright.model.structure.StructurePackage;
import org.modewright.ui.UiIds;

/** The model as a tree by kind; virtual, so that large models open at once. F2 renames, Delete deletes, a double click goes there. */
public final class StructureOutline extends Page implements IContentOutlinePage {

    private static final int MOST_SELECTED = 200;

    private final StructureEditor editor;
    private final StructureEditAdapterFactory adapterFactory;
    private final List<CategoryItemProvider> categories = new ArrayList<>();
    private Tree tree;
    private LocalResourceManager images;
    private TreeEditor inPlace;

    StructureOutline(StructureEditor editor, StructureEditAdapterFactory adapterFactory) {
        this.editor = editor;
        this.adapterFactory = adapterFactory;
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
        tree.addListener(SWT.KeyDown, this::key);
        modelChanged();
        select(editor.session().selection().elementIds());
        contributeActions();
    }

    private void contributeActions() {
        Action delete = new Action(Messages.Delete) {
            @Override
            public void run() {
                editor.delete(chosen());
            }
        };
        Action rename = new Action(Messages.Rename) {
            @Override
            public void run() {
                rename();
            }
        };
        getSite().getActionBars().setGlobalActionHandler(ActionFactory.DELETE.getId(), delete);
        getSite().getActionBars().setGlobalActionHandler(ActionFactory.RENAME.getId(), rename);
        getSite().getActionBars().setGlobalActionHandler(ActionFactory.UNDO.getId(),
                editor.getEditorSite().getActionBars().getGlobalActionHandler(ActionFactory.UNDO.getId()));
        getSite().getActionBars().setGlobalActionHandler(ActionFactory.REDO.getId(),
                editor.getEditorSite().getActionBars().getGlobalActionHandler(ActionFactory.REDO.getId()));
        MenuManager menu = new MenuManager();
        menu.add(rename);
        menu.add(delete);
        tree.setMenu(menu.createContextMenu(tree));
        tree.addListener(SWT.Dispose, event -> menu.dispose());
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
        }
        tree.clearAll(true);
        select(editor.session().selection().elementIds());
    }

    private void collectCategories() {
        categories.clear();
        if (editor.model() == null) {
            return;
        }
        for (EReference list : StructurePackage.Literals.STRUCTURAL_MODEL.getEAllContainments()) {
            if (list.isMany()) {
                categories.add(adapterFactory.category(editor.model(), list));
            }
        }
    }

    private void label(TreeItem item, int category) {
        item.setText(categories.get(category).getText(categories.get(category)));
        item.setImage(image(categories.get(category).getImage(categories.get(category))));
        item.setItemCount(categories.get(category).objects().size());
    }

    private void fill(Event event) {
        TreeItem item = (TreeItem) event.item;
        TreeItem parent = item.getParentItem();
        if (parent == null) {
            if (event.index < categories.size()) {
                label(item, event.index);
            }
            return;
        }
        Object object = object(tree.indexOf(parent), event.index);
        if (object != null) {
            IItemLabelProvider labels = (IItemLabelProvider) adapterFactory.adapt(object, IItemLabelProvider.class);
            item.setText(Labels.of(object));
            item.setImage(image(labels.getImage(object)));
        }
    }

    private Object object(int category, int index) {
        if (category < 0 || category >= categories.size()) {
            return null;
        }
        List<?> objects = categories.get(category).objects();
        return index < objects.size() ? objects.get(index) : null;
    }

    private Image image(Object address) {
        return address instanceof URL url ? images.get(ImageDescriptor.createFromURL(url)) : null;
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

    private void key(Event event) {
        if (event.keyCode == SWT.F2) {
            rename();
        }
    }

    private void rename() {
        TreeItem[] selection = tree.getSelection();
        Identified object = selection.length == 1 ? object(selection[0]) : null;
        if (object == null) {
            return;
        }
        Text text = new Text(tree, SWT.BORDER);
        text.setText(object.getName() == null ? "" : object.getName());
        text.selectAll();
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
            text.setBackground(org.modewright.ui.widgets.ThemeColours.mix(org.modewright.ui.widgets.ThemeColours.failed(text), tree.getBackground(), 0.2));
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
