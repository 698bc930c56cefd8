package org.modewright.ui.modes;

import java.util.Arrays;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import org.eclipse.jface.action.Action;
import org.eclipse.jface.action.Separator;
import org.eclipse.swt.SWT;
import org.eclipse.swt.custom.CTabFolder;
import org.eclipse.swt.custom.CTabItem;
import org.eclipse.swt.custom.StackLayout;
import org.eclipse.swt.layout.FillLayout;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.layout.GridLayout;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;
import org.eclipse.ui.IActionBars;
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
import org.modewright.ui.widgets.Images;
import org.modewright.ui.widgets.SentenceBar;
import org.modewright.ui.widgets.SessionPage;
import org.modewright.ui.widgets.TextCopy;

/** What makes a mode so? A sentence, then the elements ranked by energy; and the other way round, the modes of the selected elements. */
public final class DominanceView extends ViewPart {

    private static final String ROLL_UP_KEY = "rollUp";
    private static final int RANKING_TAB = 0;

    private AuditSession session;
    private SessionPage page;
    private SentenceBar sentence;
    private CTabFolder tabs;
    private final StackLayout stack = new StackLayout();
    private Composite rankingBody;
    private Composite ranked;
    private EmptyState noMode;
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
        elementModes = new ElementModes(tabs, this::modePicked, this::showSentence);
        tab(Messages.Dominance_tabModes, elementModes.control());
        tabs.setSelection(RANKING_TAB);
        tabs.addListener(SWT.Selection, event -> showSentence());
        contributeActions();
        AuditSession.Listener listener = this::changed;
        session.addListener(listener);
        page.addListener(SWT.Dispose, event -> session.removeListener(listener));
        showAll();
    }

    private void contributeActions() {
        IActionBars bars = getViewSite().getActionBars();
        RollUpChoice choice = new RollUpChoice(by, this::rollUpChosen);
        bars.getToolBarManager().add(choice.toolItem());
        choice.fill(bars.getMenuManager());
        page.addListener(SWT.Dispose, event -> choice.dispose());
        Action copy = new Action(Messages.Dominance_copy, Images.descriptor(Images.COPY)) {
            @Override
            public void run() {
                copy();
            }
        };
        bars.getMenuManager().add(new Separator());
        bars.getMenuManager().add(copy);
        bars.setGlobalActionHandler(ActionFactory.COPY.getId(), copy);
    }

    private void createRanking() {
        rankingBody = new Composite(tabs, SWT.NONE);
        rankingBody.setLayout(stack);
        noMode = new EmptyState(rankingBody);
        ranked = new Composite(rankingBody, SWT.NONE);
        ranked.setLayout(new FillLayout());
        ranking = new RankingTable(ranked, this::rowsPicked, session::revealProperties, this::rankBy);
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
        showSentence();
        if (session.selectionSource() != this) {
            ranking.select(session.selection().elementIds());
        }
    }

    private void showNoMode(ModalResult result) {
        shownMode = -1;
        boolean any = !result.modes().isEmpty();
        noMode.show(any ? Messages.Dominance_noMode : Messages.Modes_sentenceNone, any ? Messages.Dominance_selectFirst : null,
                any ? () -> modePicked(0) : null);
        top(noMode);
    }

    private void showRanking(ModalResult result, int mode) {
        if (result != shownResult || mode != shownMode) {
            shownResult = result;
            shownMode = mode;
            refreshRanking();
        }
        top(ranked);
    }

    /** The sentence answers the question of the tab in front. */
    private void showSentence() {
        String words = tabs.getSelectionIndex() != RANKING_TAB ? elementModes.sentence()
                : shownMode < 0 || shownResult == null ? "" : DominanceSentence.of(shownResult, shownMode);
        sentence.show(words.isEmpty() ? SentenceBar.Sign.NONE : SentenceBar.Sign.INFORMATION, words);
    }

    private void refreshRanking() {
        if (shownResult != null && shownMode >= 0) {
            ranking.show(DominanceRow.of(shownResult, shownMode, by, rankedBy), RollUpChoice.header(by), rankedBy);
        }
    }

    private void top(Control control) {
        if (stack.topControl != control) {
            stack.topControl = control;
            rankingBody.layout(true, true);
        }
    }

    private void rollUpChosen(RollUp chosen) {
        by = chosen;
        refreshRanking();
        ranking.select(session.selection().elementIds());
    }

    private void rankBy(Energy energy) {
        rankedBy = energy;
        refreshRanking();
    }

    private void rowsPicked(List<DominanceRow> rows) {
        Set<String> ids = new HashSet<>();
        rows.forEach(row -> ids.addAll(row.elementIds(shownResult, by)));
        session.select(session.selection().withElements(ids), this);
    }

    private void modePicked(int mode) {
        session.select(session.selection().elementIds().isEmpty() ? AuditSelection.ofMode(session.result().modal(), mode)
                : session.selection().withMode(mode), this);
    }

    private void copy() {
        TextCopy.put(tabs.getDisplay(), tabs.getSelectionIndex() == RANKING_TAB ? ranking.text() : elementModes.text());
    }
}
