package org.modewright.ui.modes;

import java.util.Arrays;
import java.util.Set;
import org.eclipse.jface.action.Action;
import org.eclipse.swt.SWT;
import org.eclipse.swt.custom.CTabFolder;
import org.eclipse.swt.custom.CTabItem;
import org.eclipse.swt.custom.StackLayout;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.layout.GridLayout;
import org.eclipse.swt.widgets.Combo;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swt.widgets.Label;
import org.eclipse.ui.IMemento;
import org.eclipse.ui.IViewSite;
import org.eclipse.ui.PartInitException;
import org.eclipse.ui.actions.ActionFactory;
import org.eclipse.ui.part.ViewPart;
import org.modewright.modal.Dominance.Energy;
import org.modewright.modal.Dominance.RollUp;
import org.modewright.modal.ModalResult;
import org.modewright.ui.AuditSelection;
import org.modewright.ui.AuditSession;
import org.modewright.ui.AuditSession.Change;
import org.modewright.ui.UiIds;
import org.modewright.ui.widgets.EmptyState;
import org.modewright.ui.widgets.SentenceBar;
import org.modewright.ui.widgets.SessionPage;
import org.modewright.ui.widgets.TextCopy;

/** What makes a mode so? A sentence, then the elements ranked by energy; and the other way round, the modes of the selected elements. */
public final class DominanceView extends ViewPart {

    private static final String ROLL_UP_KEY = "rollUp";

    private AuditSession session;
    private SessionPage page;
    private SentenceBar sentence;
    private CTabFolder tabs;
    private final StackLayout stack = new StackLayout();
    private Composite rankingBody;
    private Composite ranked;
    private EmptyState noMode;
    private Combo rollUp;
    private RankingTable ranking;
    private ElementModes elementModes;
    private RollUp by = RollUp.ELEMENT;
    private Energy rankedBy = Energy.STRAIN;
    private ModalResult shownResult;
    private int shownMode = -1;

    @Override
    public void init(IViewSite site, IMemento saved) throws PartInitException {
        super.init(site, saved);
        String name = saved == null ? null : saved.getString(ROLL_UP_KEY);
        by = Arrays.stream(RollUp.values()).filter(value -> value.name().equals(name)).findFirst().orElse(RollUp.ELEMENT);
    }

    @Override
    public void saveState(IMemento memento) {
        memento.putString(ROLL_UP_KEY, by.name());
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
        tabs.setData(UiIds.WIDGET_ID, "dominance.tabs");
        createRanking();
        elementModes = new ElementModes(tabs, this::modePicked);
        tab(Messages.Dominance_tabModes, elementModes.control());
        tabs.setSelection(0);
        getViewSite().getActionBars().setGlobalActionHandler(ActionFactory.COPY.getId(), new Action() {
            @Override
            public void run() {
                copy();
            }
        });
        AuditSession.Listener listener = this::changed;
        session.addListener(listener);
        page.addListener(SWT.Dispose, event -> session.removeListener(listener));
        showAll();
    }

    private void createRanking() {
        rankingBody = new Composite(tabs, SWT.NONE);
        rankingBody.setLayout(stack);
        noMode = new EmptyState(rankingBody);
        ranked = new Composite(rankingBody, SWT.NONE);
        GridLayout layout = new GridLayout(2, false);
        layout.marginHeight = 4;
        layout.marginWidth = 0;
        ranked.setLayout(layout);
        Label label = new Label(ranked, SWT.NONE);
        label.setText(Messages.Dominance_by);
        GridData indented = new GridData();
        indented.horizontalIndent = 8;
        label.setLayoutData(indented);
        rollUp = new Combo(ranked, SWT.READ_ONLY);
        rollUp.setData(UiIds.WIDGET_ID, "dominance.rollUp");
        rollUp.setItems(Arrays.stream(RollUp.values()).map(DominanceView::label).toArray(String[]::new));
        rollUp.select(by.ordinal());
        rollUp.addListener(SWT.Selection, event -> rollUpChosen());
        ranking = new RankingTable(ranked, this::elementsPicked, id -> session.revealProperties(id), this::rankBy);
        ranking.control().setLayoutData(new GridData(SWT.FILL, SWT.FILL, true, true, 2, 1));
        tab(Messages.Dominance_tabRanking, rankingBody);
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

    private static String label(RollUp by) {
        return switch (by) {
            case ELEMENT -> Messages.Dominance_ELEMENT;
            case GROUP -> Messages.Dominance_GROUP;
            case LEVEL -> Messages.Dominance_LEVEL;
            case SECTION -> Messages.Dominance_SECTION;
            case MATERIAL -> Messages.Dominance_MATERIAL;
        };
    }

    private void changed(Change change) {
        switch (change) {
            case RESULT, SELECTION -> showAll();
            default -> sentence.setStale(session.isStale(), session::run);
        }
    }

    private void showAll() {
        sentence.setStale(session.isStale(), session::run);
        if (session.result() == null) {
            shownResult = null;
            elementModes.show(null, Set.of());
            return;
        }
        ModalResult result = session.result().modal();
        int mode = session.selection().mode();
        if (mode < 0 || mode >= result.modes().size()) {
            showNoMode(result);
        } else {
            showRanking(result, mode);
        }
        elementModes.show(result, session.selection().elementIds());
        if (session.selectionSource() != this) {
            ranking.select(session.selection().elementIds());
        }
    }

    private void showNoMode(ModalResult result) {
        shownMode = -1;
        sentence.show(SentenceBar.Sign.NONE, "");
        boolean any = !result.modes().isEmpty();
        noMode.show(any ? Messages.Dominance_noMode : Messages.Modes_sentenceNone, any ? Messages.Dominance_selectFirst : null,
                any ? () -> modePicked(0) : null);
        top(noMode);
    }

    private void showRanking(ModalResult result, int mode) {
        if (result != shownResult || mode != shownMode) {
            shownResult = result;
            shownMode = mode;
            sentence.show(SentenceBar.Sign.INFORMATION, DominanceSentence.of(result, mode));
            refreshRanking();
        }
        top(ranked);
    }

    private void refreshRanking() {
        if (shownResult != null && shownMode >= 0) {
            ranking.show(DominanceRow.of(shownResult, shownMode, by, rankedBy), label(by), rankedBy);
        }
    }

    private void top(Control control) {
        if (stack.topControl != control) {
            stack.topControl = control;
            rankingBody.layout(true, true);
        }
    }

    private void rollUpChosen() {
        by = RollUp.values()[rollUp.getSelectionIndex()];
        refreshRanking();
    }

    private void rankBy(Energy energy) {
        rankedBy = energy;
        refreshRanking();
    }

    private void elementsPicked(Set<String> ids) {
        session.select(session.selection().withElements(ids), this);
    }

    private void modePicked(int mode) {
        session.select(session.selection().elementIds().isEmpty() ? AuditSelection.ofMode(session.result().modal(), mode)
                : session.selection().withMode(mode), this);
    }

    private void copy() {
        TextCopy.put(tabs.getDisplay(), ranking.text());
    }
}
