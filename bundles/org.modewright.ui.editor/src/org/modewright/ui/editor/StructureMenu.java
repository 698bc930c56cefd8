package org.modewright.ui.editor;

import java.util.List;
import org.eclipse.jface.action.IMenuManager;
import org.eclipse.jface.action.MenuManager;
import org.eclipse.jface.action.Separator;
import org.eclipse.swt.SWT;
import org.eclipse.swt.widgets.Control;
import org.eclipse.ui.IWorkbenchCommandConstants;
import org.eclipse.ui.menus.CommandContributionItem;
import org.eclipse.ui.menus.CommandContributionItemParameter;
import org.eclipse.ui.services.IServiceLocator;

/** The context menu of the drawing, the tables and the outline: the acts of the Structure menu, rename, copy and delete. */
final class StructureMenu {

    private static final String PREFIX = "org.modewright.ui.editor.";
    private static final List<String> ADD = List.of("addNode", "addMember", "addSupport", "addMass", "addSpring");
    private static final List<String> CHANGE = List.of("duplicate", "joinNodes", "splitMember", "assignGroup");

    private StructureMenu() {
    }

    static void offer(Control control, IServiceLocator site) {
        MenuManager menu = new MenuManager();
        ADD.forEach(act -> add(menu, site, PREFIX + act));
        menu.add(new Separator());
        CHANGE.forEach(act -> add(menu, site, PREFIX + act));
        menu.add(new Separator());
        add(menu, site, IWorkbenchCommandConstants.FILE_RENAME);
        add(menu, site, IWorkbenchCommandConstants.EDIT_COPY);
        add(menu, site, IWorkbenchCommandConstants.EDIT_DELETE);
        control.setMenu(menu.createContextMenu(control));
        control.addListener(SWT.Dispose, event -> menu.dispose());
    }

    private static void add(IMenuManager menu, IServiceLocator site, String command) {
        int push = CommandContributionItem.STYLE_PUSH;
        menu.add(new CommandContributionItem(new CommandContributionItemParameter(site, null, command, push)));
    }
}
