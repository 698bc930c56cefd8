package org.modewright.ui.modes;

import org.eclipse.jface.action.Action;
import org.eclipse.jface.action.IAction;
import org.eclipse.jface.action.IMenuManager;
import org.eclipse.swt.SWT;
import org.eclipse.swt.custom.CTabFolder;
import org.eclipse.swt.custom.CTabItem;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.layout.GridLayout;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;
import org.eclipse.ui.IMemento;
import org.eclipse.ui.IViewSite;
import org.eclipse.ui.PartInitException;
import org.eclipse.ui.actions.ActionFactory;
import org.eclipse.ui.part.ViewPart;
import org.modewright.audit.AuditResult;
import org.modewright.model.Quantity;
import org.modewright.model.Units;
import org.modewright.model.structure.StructuralModel;
import org.modewright.ui.AuditSelection;
import org.modewright.ui.AuditSession;
import org.modewright.ui.AuditSession.Change;
import org.modewright.ui.UiIds;
import org.modewright.ui.widgets.SentenceBar;
import org.modewright.ui.widgets.SessionPage;

/** Are the modes enough? A sentence a direction, the staircase of effective mass, and the masses by source. */
public final class CaptureView extends ViewPart {

    private static final String PERIOD_KEY = "byPeriod";

    private AuditSession session;
    private SessionPage page;
    private SentenceBar sentence;
    private CTabFolder tabs;
    private StaircasePlot plot;
    private MassTable masses;
    private boolean byPeriod;

    @Override
    public void init(IViewSite site, IMemento saved) throws PartInitException {
        super.init(site, saved);
        byPeriod = saved != null && Boolean.TRUE.equals(saved.getBoolean(PERIOD_KEY));
    }

    @Override
    public void createPartControl(Composite parent) {
        session = getSite().getService(AuditSession.class);
        page = new SessionPage(parent, session);
        Composite content = page.content();
        GridLayout layout = new GridLayout();
        layout.marginWidth = 0;
        layout.marginHeight = 0;
        content.setLayout(layout);
        sentence = new SentenceBar(content);
        sentence.setLayoutData(new GridData(SWT.FILL, SWT.TOP, true, false));
        tabs = new CTabFolder(content, SWT.BOTTOM | SWT.FLAT);
        tabs.setLayoutData(new GridData(SWT.FILL, SWT.FILL, true, true));
        tabs.setData(UiIds.WIDGET_ID, "capture.tabs");
        plot = new StaircasePlot(tabs, this::modePicked);
        plot.setByPeriod(byPeriod);
        tab(Messages.Capture_tabStaircase, plot);
        masses = new MassTable(tabs);
        tab(Messages.Capture_tabMasses, masses.control());
        tabs.setSelection(0);
        contributeActions();
        AuditSession.Listener listener = this::changed;
        session.addListener(listener);
        page.addListener(SWT.Dispose, event -> session.removeListener(listener));
        showResult();
    }

    private void tab(String label, Control control) {
        CTabItem item = new CTabItem(tabs, SWT.NONE);
        item.setText(label);
        item.setControl(control);
    }

    @Override
    public void setFocus() {
        if (page.hasContent()) {
            tabs.getSelection().getControl().setFocus();
        } else {
            page.setFocus();
        }
    }

    @Override
    public void saveState(IMemento memento) {
        memento.putBoolean(PERIOD_KEY, byPeriod);
    }

    private void contributeActions() {
        IMenuManager menu = getViewSite().getActionBars().getMenuManager();
        menu.add(axisAction(Messages.Capture_overNumber, false));
        menu.add(axisAction(Messages.Capture_overPeriod, true));
        Action copy = new Action() {
            @Override
            public void run() {
                masses.copy();
            }
        };
        getViewSite().getActionBars().setGlobalActionHandler(ActionFactory.COPY.getId(), copy);
    }

    private IAction axisAction(String label, boolean period) {
        Action action = new Action(label, IAction.AS_RADIO_BUTTON) {
            @Override
            public void run() {
                if (isChecked()) {
                    byPeriod = period;
                    plot.setByPeriod(period);
                }
            }
        };
        action.setChecked(byPeriod == period);
        return action;
    }

    private void changed(Change change) {
        switch (change) {
            case RESULT -> showResult();
            case SELECTION -> plot.select(session.selection().mode());
            default -> sentence.setStale(session.isStale(), session::run);
        }
    }

    private void showResult() {
        AuditResult audit = session.result();
        sentence.setStale(session.isStale(), session::run);
        plot.show(audit);
        if (audit == null) {
            return;
        }
        sentence.show(CaptureSentence.sign(audit), CaptureSentence.of(audit));
        plot.select(session.selection().mode());
        showMasses(audit);
    }

    private void showMasses(AuditResult audit) {
        StructuralModel model = session.model();
        if (model == null) {
            masses.show(audit.modal(), 1, "kg");
        } else {
            Units units = Units.of(model);
            masses.show(audit.modal(), units.mass(), units.symbol(Quantity.MASS));
        }
    }

    private void modePicked(int mode) {
        session.select(AuditSelection.ofMode(session.result().modal(), mode), this);
    }
}
