package org.modewright.ui.modes;

import java.util.ArrayList;
import java.util.List;
import java.util.function.Consumer;
import org.eclipse.jface.action.Action;
import org.eclipse.jface.action.ActionContributionItem;
import org.eclipse.jface.action.IAction;
import org.eclipse.jface.action.IContributionItem;
import org.eclipse.jface.action.IMenuCreator;
import org.eclipse.jface.action.IMenuManager;
import org.eclipse.jface.action.MenuManager;
import org.eclipse.osgi.util.NLS;
import org.eclipse.swt.graphics.Point;
import org.eclipse.swt.graphics.Rectangle;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swt.widgets.Event;
import org.eclipse.swt.widgets.Menu;
import org.eclipse.swt.widgets.ToolItem;
import org.modewright.modal.Dominance.RollUp;

/** Chooses what energies are summed by, in the tool bar of a view and in its menu. */
final class RollUpChoice {

    private final Consumer<RollUp> whenChosen;
    private final MenuManager menus = new MenuManager();
    private final List<IAction> choices = new ArrayList<>();
    private final DropDown dropDown = new DropDown();
    private RollUp chosen;

    RollUpChoice(RollUp chosen, Consumer<RollUp> whenChosen) {
        this.chosen = chosen;
        this.whenChosen = whenChosen;
        fill(menus);
        refresh();
    }

    /** Adds the choices to a menu. */
    void fill(IMenuManager menu) {
        for (RollUp by : RollUp.values()) {
            Action choice = new Action(NLS.bind(Messages.Dominance_rollUp, word(by)), IAction.AS_RADIO_BUTTON) {
                @Override
                public void run() {
                    if (isChecked()) {
                        choose(by);
                    }
                }
            };
            choice.setId(by.name());
            choice.setChecked(by == chosen);
            choices.add(choice);
            menu.add(choice);
        }
    }

    /** The item of the tool bar: says what is chosen, opens the choices. */
    IContributionItem toolItem() {
        ActionContributionItem item = new ActionContributionItem(dropDown);
        item.setMode(ActionContributionItem.MODE_FORCE_TEXT);
        return item;
    }

    void dispose() {
        menus.dispose();
    }

    private void choose(RollUp by) {
        chosen = by;
        refresh();
        whenChosen.accept(by);
    }

    private void refresh() {
        dropDown.setText(NLS.bind(Messages.Dominance_rollUp, word(chosen)));
        choices.forEach(choice -> choice.setChecked(choice.getId().equals(chosen.name())));
    }

    private static String word(RollUp by) {
        return switch (by) {
            case ELEMENT -> Messages.Dominance_ELEMENT;
            case GROUP -> Messages.Dominance_GROUP;
            case LEVEL -> Messages.Dominance_LEVEL;
            case SECTION -> Messages.Dominance_SECTION;
            case MATERIAL -> Messages.Dominance_MATERIAL;
        };
    }

    /** The header of the column of names. */
    static String header(RollUp by) {
        String word = word(by);
        return Character.toUpperCase(word.charAt(0)) + word.substring(1);
    }

    private final class DropDown extends Action implements IMenuCreator {

        DropDown() {
            super("", IAction.AS_DROP_DOWN_MENU);
            setToolTipText(Messages.Dominance_rollUpTip);
            setMenuCreator(this);
        }

        @Override
        public void runWithEvent(Event event) {
            if (event.widget instanceof ToolItem item) {
                Rectangle bounds = item.getBounds();
                Point below = item.getParent().toDisplay(bounds.x, bounds.y + bounds.height);
                Menu menu = getMenu(item.getParent());
                menu.setLocation(below);
                menu.setVisible(true);
            }
        }

        @Override
        public Menu getMenu(Control parent) {
            return menus.createContextMenu(parent);
        }

        @Override
        public Menu getMenu(Menu parent) {
            return null;
        }

        @Override
        public void dispose() {
            menus.dispose();
        }
    }
}
