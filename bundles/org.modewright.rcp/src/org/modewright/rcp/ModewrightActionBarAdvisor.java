package org.modewright.rcp;

import org.eclipse.jface.action.GroupMarker;
import org.eclipse.jface.action.ICoolBarManager;
import org.eclipse.jface.action.IMenuManager;
import org.eclipse.jface.action.IStatusLineManager;
import org.eclipse.jface.action.MenuManager;
import org.eclipse.jface.action.Separator;
import org.eclipse.ui.ISharedImages;
import org.eclipse.ui.IWorkbenchActionConstants;
import org.eclipse.ui.IWorkbenchWindow;
import org.eclipse.ui.actions.ActionFactory;
import org.eclipse.ui.actions.ActionFactory.IWorkbenchAction;
import org.eclipse.ui.actions.ContributionItemFactory;
import org.eclipse.ui.application.ActionBarAdvisor;
import org.eclipse.ui.application.IActionBarConfigurer;
import org.eclipse.ui.menus.CommandContributionItem;
import org.eclipse.ui.menus.CommandContributionItemParameter;

/** The window's own menus and tool bar, to which the product's plug-ins add theirs. */
final class ModewrightActionBarAdvisor extends ActionBarAdvisor {

    private IWorkbenchWindow window;

    ModewrightActionBarAdvisor(IActionBarConfigurer configurer) {
        super(configurer);
    }

    @Override
    protected void makeActions(IWorkbenchWindow shown) {
        window = shown;
        for (ActionFactory factory : new ActionFactory[] {ActionFactory.SAVE, ActionFactory.SAVE_ALL, ActionFactory.CLOSE,
            ActionFactory.CLOSE_ALL, ActionFactory.REVERT, ActionFactory.REFRESH, ActionFactory.PROPERTIES, ActionFactory.QUIT,
            ActionFactory.UNDO, ActionFactory.REDO, ActionFactory.CUT, ActionFactory.COPY, ActionFactory.PASTE, ActionFactory.DELETE,
            ActionFactory.SELECT_ALL, ActionFactory.RENAME, ActionFactory.FIND, ActionFactory.PREFERENCES, ActionFactory.ABOUT,
            ActionFactory.RESET_PERSPECTIVE, ActionFactory.OPEN_NEW_WINDOW}) {
            register(factory.create(shown));
        }
        illustrate(ActionFactory.UNDO, ISharedImages.IMG_TOOL_UNDO, ISharedImages.IMG_TOOL_UNDO_DISABLED);
        illustrate(ActionFactory.REDO, ISharedImages.IMG_TOOL_REDO, ISharedImages.IMG_TOOL_REDO_DISABLED);
    }

    private void illustrate(ActionFactory factory, String image, String disabled) {
        ISharedImages images = window.getWorkbench().getSharedImages();
        action(factory).setImageDescriptor(images.getImageDescriptor(image));
        action(factory).setDisabledImageDescriptor(images.getImageDescriptor(disabled));
    }

    @Override
    protected void fillMenuBar(IMenuManager bar) {
        bar.add(fileMenu());
        bar.add(editMenu());
        bar.add(new GroupMarker(IWorkbenchActionConstants.MB_ADDITIONS));
        bar.add(viewMenu());
        bar.add(helpMenu());
    }

    @Override
    protected void fillCoolBar(ICoolBarManager bar) {
        bar.add(new GroupMarker(IWorkbenchActionConstants.GROUP_FILE));
        bar.add(new GroupMarker(IWorkbenchActionConstants.MB_ADDITIONS));
    }

    @Override
    protected void fillStatusLine(IStatusLineManager line) {
        line.add(new CertificateItem(window));
    }

    private MenuManager fileMenu() {
        MenuManager menu = new MenuManager(Messages.Menu_file, IWorkbenchActionConstants.M_FILE);
        menu.add(new GroupMarker(IWorkbenchActionConstants.FILE_START));
        menu.add(new GroupMarker(IWorkbenchActionConstants.NEW_EXT));
        menu.add(new Separator());
        menu.add(new GroupMarker(IWorkbenchActionConstants.IMPORT_EXT));
        menu.add(new Separator());
        add(menu, ActionFactory.CLOSE, ActionFactory.CLOSE_ALL);
        menu.add(new Separator());
        add(menu, ActionFactory.SAVE, ActionFactory.SAVE_ALL, ActionFactory.REVERT);
        menu.add(new GroupMarker(IWorkbenchActionConstants.SAVE_EXT));
        menu.add(new Separator());
        add(menu, ActionFactory.REFRESH, ActionFactory.PROPERTIES);
        menu.add(new GroupMarker(IWorkbenchActionConstants.MB_ADDITIONS));
        menu.add(new Separator());
        add(menu, ActionFactory.QUIT);
        menu.add(new GroupMarker(IWorkbenchActionConstants.FILE_END));
        return menu;
    }

    private MenuManager editMenu() {
        MenuManager menu = new MenuManager(Messages.Menu_edit, IWorkbenchActionConstants.M_EDIT);
        menu.add(new GroupMarker(IWorkbenchActionConstants.EDIT_START));
        add(menu, ActionFactory.UNDO, ActionFactory.REDO);
        menu.add(new GroupMarker(IWorkbenchActionConstants.UNDO_EXT));
        menu.add(new Separator());
        add(menu, ActionFactory.CUT, ActionFactory.COPY, ActionFactory.PASTE);
        menu.add(new GroupMarker(IWorkbenchActionConstants.CUT_EXT));
        menu.add(new Separator());
        add(menu, ActionFactory.DELETE, ActionFactory.SELECT_ALL, ActionFactory.RENAME);
        menu.add(new Separator());
        add(menu, ActionFactory.FIND);
        menu.add(new GroupMarker(IWorkbenchActionConstants.MB_ADDITIONS));
        menu.add(new GroupMarker(IWorkbenchActionConstants.EDIT_END));
        return menu;
    }

    private MenuManager viewMenu() {
        MenuManager menu = new MenuManager(Messages.Menu_view, "view");
        menu.add(ContributionItemFactory.VIEWS_SHORTLIST.create(window));
        menu.add(new Separator());
        menu.add(new GroupMarker(IWorkbenchActionConstants.MB_ADDITIONS));
        menu.add(new Separator());
        add(menu, ActionFactory.RESET_PERSPECTIVE, ActionFactory.OPEN_NEW_WINDOW);
        menu.add(new Separator());
        add(menu, ActionFactory.PREFERENCES);
        return menu;
    }

    private MenuManager helpMenu() {
        MenuManager menu = new MenuManager(Messages.Menu_help, IWorkbenchActionConstants.M_HELP);
        menu.add(new GroupMarker(IWorkbenchActionConstants.HELP_START));
        menu.add(command("org.eclipse.ui.window.showKeyAssist", Messages.Menu_keys));
        menu.add(new GroupMarker(IWorkbenchActionConstants.MB_ADDITIONS));
        menu.add(new Separator());
        add(menu, ActionFactory.ABOUT);
        menu.add(new GroupMarker(IWorkbenchActionConstants.HELP_END));
        return menu;
    }

    private CommandContributionItem command(String id, String label) {
        CommandContributionItemParameter parameter = new CommandContributionItemParameter(window, id, id,
                CommandContributionItem.STYLE_PUSH);
        parameter.label = label;
        return new CommandContributionItem(parameter);
    }

    private void add(IMenuManager menu, ActionFactory... factories) {
        for (ActionFactory factory : factories) {
            menu.add(action(factory));
        }
    }

    private IWorkbenchAction action(ActionFactory factory) {
        return (IWorkbenchAction) getAction(factory.getId());
    }
}
