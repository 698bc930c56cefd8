package org.modewright.testsupport;

import java.util.Arrays;
import java.util.List;
import org.eclipse.e4.ui.model.application.ui.basic.MPart;
import org.eclipse.jface.action.ActionContributionItem;
import org.eclipse.jface.action.IAction;
import org.eclipse.jface.action.IContributionItem;
import org.eclipse.swt.SWT;
import org.eclipse.swt.custom.CTabFolder;
import org.eclipse.swt.graphics.ImageData;
import org.eclipse.swt.widgets.Combo;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swt.widgets.Event;
import org.eclipse.swt.widgets.Label;
import org.eclipse.swt.widgets.Link;
import org.eclipse.swt.widgets.Table;
import org.eclipse.swt.widgets.Text;
import org.eclipse.swt.widgets.Tree;
import org.eclipse.ui.IViewPart;
import org.eclipse.ui.IWorkbenchPage;
import org.eclipse.ui.IWorkbenchPart;
import org.eclipse.ui.PartInitException;
import org.eclipse.ui.PlatformUI;
import org.modewright.ui.widgets.EmptyState;
import org.modewright.ui.widgets.SentenceBar;

/** A view or an editor. */
public final class ViewObject {

    private final UiThread ui;
    private final IWorkbenchPart part;

    ViewObject(UiThread ui, IWorkbenchPart part) {
        this.ui = ui;
        this.part = part;
    }

    /** Shows a view, opening it if need be. */
    static ViewObject show(UiThread ui, String id) {
        IViewPart view = ui.get(() -> open(id));
        return new ViewObject(ui, view);
    }

    private static IViewPart open(String id) throws PartInitException {
        IWorkbenchPage page = PlatformUI.getWorkbench().getActiveWorkbenchWindow().getActivePage();
        return page.showView(id);
    }

    /** The part itself, for what only it can tell. */
    public IWorkbenchPart part() {
        return part;
    }

    /** The sentence of an empty view; null if the view has content. */
    public String emptySentence() {
        return ui.get(() -> {
            EmptyState empty = Widgets.find(root(), EmptyState.class, Control::isVisible);
            return empty == null ? null : empty.sentence();
        });
    }

    /** Clicks the link of an empty view. */
    public void clickEmptyLink() {
        ui.later(() -> {
            EmptyState empty = Widgets.find(root(), EmptyState.class, Control::isVisible);
            Widgets.click(Widgets.find(empty, Link.class, "emptyState.link"));
        });
    }

    /** The view's answer in one sentence; null if it shows none. */
    public String sentence() {
        return ui.get(() -> {
            SentenceBar bar = Widgets.find(root(), SentenceBar.class, Control::isVisible);
            return bar == null ? null : bar.sentence();
        });
    }

    /** Whether the view says that its result is stale. */
    public boolean isMarkedStale() {
        return ui.get(() -> {
            SentenceBar bar = Widgets.find(root(), SentenceBar.class, Control::isVisible);
            return bar != null && bar.isStale();
        });
    }

    public TableObject table(String id) {
        return new TableObject(ui, id, () -> Widgets.find(root(), Table.class, id));
    }

    /** Names of the selected items of a tree. */
    public List<String> treeSelection(String id) {
        return ui.get(() -> {
            Tree tree = Widgets.find(root(), Tree.class, id);
            return Arrays.stream(tree.getSelection()).map(item -> item.getText()).toList();
        });
    }

    /** Text of a label, a field or a box. */
    public String text(String id) {
        return ui.get(() -> text(there(id)));
    }

    private static String text(Control control) {
        if (control instanceof Label label) {
            return label.getText();
        }
        return control instanceof Combo combo ? combo.getText() : ((Text) control).getText();
    }

    /** Types into a field and leaves it, as a user does with Enter. */
    public void type(String id, String text) {
        ui.run(() -> {
            Text field = (Text) there(id);
            field.setFocus();
            field.setText(text);
            Widgets.notifySelection(field, null, SWT.DefaultSelection);
        });
    }

    /** Chooses an item of a box. */
    public void choose(String id, String item) {
        ui.run(() -> {
            Combo combo = (Combo) there(id);
            combo.select(combo.indexOf(item));
            Widgets.notifySelection(combo, null, SWT.Selection);
        });
    }

    /** Brings a tab of a folder of tabs to the front. */
    public void chooseTab(String id, int tab) {
        ui.run(() -> {
            CTabFolder folder = (CTabFolder) there(id);
            folder.setSelection(tab);
            Widgets.notifySelection(folder, folder.getItem(tab), SWT.Selection);
        });
    }

    /** Runs an action of the view's menu. */
    public void chooseMenu(String actionId) {
        ui.run(() -> {
            IContributionItem item = ((IViewPart) part).getViewSite().getActionBars().getMenuManager().find(actionId);
            IAction action = ((ActionContributionItem) item).getAction();
            action.setChecked(true);
            action.run();
        });
    }

    /** Presses a key on a control: a character, or a key code of {@link SWT} with character 0. */
    public void press(String id, char character, int keyCode) {
        ui.run(() -> {
            Event event = new Event();
            event.character = character;
            event.keyCode = keyCode;
            there(id).notifyListeners(SWT.KeyDown, event);
        });
    }

    /** Presses and releases the first mouse button at a place of a control given as shares of its width and height. */
    public void click(String id, double across, double down) {
        ui.run(() -> {
            Control control = there(id);
            for (int type : new int[] {SWT.MouseDown, SWT.MouseUp}) {
                Event event = new Event();
                event.button = 1;
                event.x = (int) (across * control.getSize().x);
                event.y = (int) (down * control.getSize().y);
                control.notifyListeners(type, event);
            }
        });
    }

    /** Clicks a link of a name, such as one of the start page. */
    public void clickLink(String scope, String id) {
        ui.later(() -> Widgets.click(Widgets.find(there(scope), Link.class, id)));
    }

    /** Whether there is a control of a name. */
    public boolean has(String id) {
        return ui.get(() -> Widgets.find(root(), Control.class, id) != null);
    }

    /** What a control of a name shows, pixel by pixel. */
    public ImageData picture(String id) {
        return ui.get(() -> Screenshots.of(there(id)));
    }

    private Control there(String id) {
        Control found = Widgets.find(root(), Control.class, id);
        if (found == null) {
            throw new AssertionError("The part " + part.getTitle() + " has no control " + id + ".");
        }
        return found;
    }

    private Control root() {
        return (Control) part.getSite().getService(MPart.class).getWidget();
    }
}
