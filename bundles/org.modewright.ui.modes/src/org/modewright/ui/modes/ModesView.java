package org.modewright.ui.modes;

import java.util.Set;
import java.util.stream.Collectors;
import org.eclipse.core.runtime.ILog;
import org.eclipse.jface.action.Action;
import org.eclipse.jface.action.IAction;
import org.eclipse.jface.action.IMenuManager;
import org.eclipse.jface.action.MenuManager;
import org.eclipse.jface.action.Separator;
import org.eclipse.swt.SWT;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.layout.GridLayout;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.ui.IActionBars;
import org.eclipse.ui.IMemento;
import org.eclipse.ui.IViewSite;
import org.eclipse.ui.PartInitException;
import org.eclipse.ui.actions.ActionFactory;
import org.eclipse.ui.part.ViewPart;
import org.modewright.audit.AuditResult;
import org.modewright.ui.AuditSelection;
import org.modewright.ui.AuditSession;
import org.modewright.ui.AuditSession.Change;
import org.modewright.ui.UiIds;
import org.modewright.ui.widgets.Images;
import org.modewright.ui.widgets.SentenceBar;
import org.modewright.ui.widgets.SessionPage;

/** Which modes are there? One sentence, then a table with a row a mode. */
public final class ModesView extends ViewPart {

    private static final String COLUMNS_KEY = "columns";
    private static final double HOLDING_SHARE = 0.05;

    private AuditSession session;
    private IMemento memento;
    private SessionPage page;
    private SentenceBar sentence;
    private FilterBar filterBar;
    private ModesTable table;
    private ModeRows rows;

    @Override
    public void init(IViewSite site, IMemento saved) throws PartInitException {
        super.init(site, saved);
        memento = saved;
    }

    @Override
    public void createPartControl(Composite parent) {
        session = getSite().getService(AuditSession.class);
        page = new SessionPage(parent, session);
        Composite content = page.content();
        GridLayout layout = new GridLayout();
        layout.marginWidth = 0;
        layout.marginHeight = 0;
        layout.verticalSpacing = 4;
        content.setLayout(layout);
        sentence = new SentenceBar(content);
        sentence.setLayoutData(new GridData(SWT.FILL, SWT.TOP, true, false));
        filterBar = new FilterBar(content, this::filterChosen);
        table = new ModesTable(content, this::modeSelected, this::showShape);
        table.control().setLayoutData(new GridData(SWT.FILL, SWT.FILL, true, true));
        restoreColumns();
        contributeActions();
        AuditSession.Listener listener = this::changed;
        session.addListener(listener);
        page.addListener(SWT.Dispose, event -> session.removeListener(listener));
        showResult();
    }

    @Override
    public void setFocus() {
        if (page.hasContent()) {
            table.control().setFocus();
        } else {
            page.setFocus();
        }
    }

    @Override
    public void saveState(IMemento saved) {
        saved.putString(COLUMNS_KEY, table.shownColumns().stream().map(ModeColumn::name).collect(Collectors.joining(" ")));
    }

    private void restoreColumns() {
        String saved = memento == null ? null : memento.getString(COLUMNS_KEY);
        if (saved == null) {
            return;
        }
        Set<String> names = Set.of(saved.split(" "));
        for (ModeColumn column : ModeColumn.values()) {
            table.show(column, names.contains(column.name()));
        }
    }

    private void contributeActions() {
        IAction copy = action(Messages.Modes_copy, () -> table.copy(false));
        copy.setImageDescriptor(Images.descriptor(Images.COPY));
        IAction copyAll = action(Messages.Modes_copyAll, () -> table.copy(true));
        IAction selectAll = action(Messages.Modes_selectAll, () -> table.selectAll());
        IActionBars bars = getViewSite().getActionBars();
        bars.setGlobalActionHandler(ActionFactory.COPY.getId(), copy);
        bars.setGlobalActionHandler(ActionFactory.SELECT_ALL.getId(), selectAll);
        fillMenu(bars.getMenuManager(), copy, copyAll);
        MenuManager context = new MenuManager();
        context.setRemoveAllWhenShown(true);
        context.addMenuListener(menu -> fillMenu(menu, copy, copyAll));
        table.control().setMenu(context.createContextMenu(table.control()));
        page.addListener(SWT.Dispose, event -> context.dispose());
    }

    private void fillMenu(IMenuManager menu, IAction copy, IAction copyAll) {
        MenuManager columns = new MenuManager(Messages.Modes_columns, Images.descriptor(Images.COLUMNS), null);
        columns.setRemoveAllWhenShown(true);
        columns.addMenuListener(this::fillColumns);
        menu.add(columns);
        menu.add(new Separator());
        menu.add(copy);
        menu.add(copyAll);
    }

    private void fillColumns(IMenuManager menu) {
        for (ModeColumn column : ModeColumn.values()) {
            if (column != ModeColumn.NUMBER) {
                menu.add(columnAction(column));
            }
        }
    }

    private IAction columnAction(ModeColumn column) {
        Action action = new Action(column.header(), IAction.AS_CHECK_BOX) {
            @Override
            public void run() {
                table.show(column, isChecked());
            }
        };
        action.setChecked(table.shownColumns().contains(column));
        return action;
    }

    private static IAction action(String label, Runnable body) {
        return new Action(label) {
            @Override
            public void run() {
                body.run();
            }
        };
    }

    private void changed(Change change) {
        switch (change) {
            case RESULT -> showResult();
            case SELECTION -> showSelection();
            default -> sentence.setStale(session.isStale(), session::run);
        }
    }

    private void showResult() {
        AuditResult result = session.result();
        sentence.setStale(session.isStale(), session::run);
        if (result == null) {
            rows = null;
            table.setRows(null);
            return;
        }
        if (rows == null || rows.result() != result.modal()) {
            rows = new ModeRows(result.modal());
            table.setRows(rows);
            filterBar.showCount(table.shownCount(), rows.count());
        }
        boolean complete = result.modal().certificate().complete();
        sentence.show(complete ? SentenceBar.Sign.INFORMATION : SentenceBar.Sign.WARNING, ModesSentence.of(result.modal()));
        showSelection();
    }

    private void showSelection() {
        if (rows == null) {
            return;
        }
        AuditSelection selection = session.selection();
        rows.mark(chosenElements(selection), HOLDING_SHARE);
        table.redrawSigns();
        if (session.selectionSource() != this) {
            table.select(selection.mode());
        }
    }

    /** The selected elements, unless they are just those that come with the selected mode: these would mark half of the table. */
    private Set<String> chosenElements(AuditSelection selection) {
        boolean comeWithMode = selection.hasMode() && selection.mode() < rows.count()
                && selection.equals(AuditSelection.ofMode(rows.result(), selection.mode()));
        return comeWithMode ? Set.of() : selection.elementIds();
    }

    private void filterChosen(ModeFilter filter) {
        table.setFilter(filter);
        filterBar.showCount(table.shownCount(), rows == null ? 0 : rows.count());
    }

    /** A double click or Enter on a mode goes to its shape. */
    private void showShape() {
        try {
            getSite().getPage().showView(UiIds.SHAPE_VIEW);
        } catch (PartInitException failure) {
            ILog.of(ModesView.class).error(failure.getMessage(), failure);
        }
    }

    private void modeSelected(int mode) {
        session.select(AuditSelection.ofMode(rows.result(), mode), this);
    }
}
