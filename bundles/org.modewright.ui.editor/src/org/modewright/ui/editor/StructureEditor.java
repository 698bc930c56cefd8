package org.modewright.ui.editor;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.Collection;
import java.util.List;
import java.util.Set;
import java.util.function.Function;
import org.eclipse.core.resources.IFile;
import org.eclipse.core.resources.IMarker;
import org.eclipse.core.runtime.IProgressMonitor;
import org.eclipse.emf.common.command.Command;
import org.eclipse.emf.ecore.EObject;
import org.eclipse.emf.edit.domain.EditingDomain;
import org.eclipse.emf.edit.domain.IEditingDomainProvider;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swt.widgets.Display;
import org.eclipse.swt.widgets.Shell;
import org.eclipse.ui.IEditorInput;
import org.eclipse.ui.IEditorSite;
import org.eclipse.ui.IFileEditorInput;
import org.eclipse.ui.PartInitException;
import org.eclipse.ui.ide.IGotoMarker;
import org.eclipse.ui.part.FileEditorInput;
import org.eclipse.ui.part.MultiPageEditorPart;
import org.eclipse.ui.views.contentoutline.IContentOutlinePage;
import org.modewright.audit.Finding;
import org.modewright.audit.ObjectRef;
import org.modewright.model.edit.StructureEditAdapterFactory;
import org.modewright.model.edit.commands.Deletion;
import org.modewright.model.edit.commands.StructureCommands;
import org.modewright.model.structure.Identified;
import org.modewright.model.structure.LoadPattern;
import org.modewright.model.structure.StructuralModel;
import org.modewright.ui.AuditSession;
import org.modewright.ui.StructureEditorPart;
import org.modewright.ui.editor.fields.FieldContext;
import org.modewright.ui.editor.pages.AnalysisPage;
import org.modewright.ui.editor.pages.ErrorPage;
import org.modewright.ui.editor.pages.LoadsPage;
import org.modewright.ui.editor.pages.SpaceTab;
import org.modewright.ui.editor.pages.TablesPage;
import org.modewright.workspace.FindingMarkers;

/** Edits a structural model: in space, in tables, its loads and its settings. Every act is one command and one undo. */
public final class StructureEditor extends MultiPageEditorPart
        implements StructureEditorPart, IEditingDomainProvider, IGotoMarker, EditorContext {

    private final Pages pages = new Pages();
    private final List<Runnable> modelListeners = new ArrayList<>();
    private final EditorFile file = new EditorFile(this);
    private final AuditSession.Listener sessionListener = this::sessionChanged;
    private OpenModel open;
    private AuditSession session;
    private Checks checks;
    private CheckLine checkLine;
    private StructureOutline outline;
    private EditorActions actions;
    private boolean changePending;
    private boolean reloading;

    @Override
    public void init(IEditorSite site, IEditorInput input) throws PartInitException {
        if (!(input instanceof IFileEditorInput)) {
            throw new PartInitException(Messages.Error_noFile);
        }
        super.init(site, input);
        setPartName(input.getName());
        session = site.getService(AuditSession.class);
        checks = new Checks(site.getShell().getDisplay(), this::checked);
        site.setSelectionProvider(new ObjectSelections());
        load();
        session.addListener(sessionListener);
    }

    private void load() {
        file.watch();
        open = OpenModel.read(getModelFile().getLocation().toFile().toPath(), this::edited);
        if (model() != null) {
            checks.request(model());
        }
    }

    private ModelIndex index() {
        return open.index();
    }

    @Override
    protected Composite createPageContainer(Composite parent) {
        Composite container = super.createPageContainer(parent);
        checkLine = new CheckLine(container, this, checks);
        return checkLine.below();
    }

    @Override
    protected void createPages() {
        if (model() == null) {
            addPage(Messages.Error_page, ErrorPage.class, parent -> new ErrorPage(parent, open.failure(), this::reload));
        } else {
            addPage(Messages.Page_space, SpaceTab.class, parent -> new SpaceTab(parent, this));
            addPage(Messages.Page_tables, TablesPage.class, parent -> new TablesPage(parent, this));
            addPage(Messages.Page_loads, LoadsPage.class, parent -> new LoadsPage(parent, this));
            addPage(Messages.Page_analysis, AnalysisPage.class, parent -> new AnalysisPage(parent, this));
        }
        if (actions == null) {
            actions = new EditorActions(this);
        }
        checkLine.show(model() != null);
    }

    private void addPage(String title, Class<? extends EditorPage> kind, Function<Composite, EditorPage> maker) {
        setPageText(addPage(pages.add(getContainer(), kind, maker)), title);
    }

    @Override
    protected void pageChange(int newPageIndex) {
        if (reloading) {
            return;
        }
        super.pageChange(newPageIndex);
        pages.shown(newPageIndex, selectedIds());
        if (actions != null) {
            actions.update();
        }
    }

    @Override
    public void setFocus() {
        if (pages.top() != null) {
            pages.top().setFocus();
        }
        file.userIsHere();
    }

    /** The page on top. */
    public EditorPage activePage() {
        return pages.top();
    }

    /** Brings a page to the top. */
    public void showPage(Class<? extends EditorPage> kind) {
        int page = pages.indexOf(kind);
        if (page >= 0 && page != getActivePage()) {
            setActivePage(page);
        }
    }

    /** The live checks. */
    public Checks checks() {
        return checks;
    }

    EditorActions actions() {
        return actions;
    }

    /** Ids selected in the session, if it is about this editor. */
    Set<String> selectedIds() {
        return isCurrent() ? session.selection().elementIds() : Set.of();
    }

    StructureEditAdapterFactory adapterFactory() {
        return open.adapterFactory();
    }

    private void edited() {
        if (!changePending) {
            changePending = true;
            display().asyncExec(this::publishChange);
        }
    }

    private Display display() {
        return getSite().getShell().getDisplay();
    }

    boolean isClosed() {
        return getContainer() == null || getContainer().isDisposed();
    }

    private void publishChange() {
        changePending = false;
        if (isClosed() || model() == null) {
            return;
        }
        firePropertyChange(PROP_DIRTY);
        forgetWhatIsGone();
        pages.modelChanged();
        if (outline != null) {
            outline.modelChanged();
        }
        actions.update();
        checks.request(model());
        List.copyOf(modelListeners).forEach(Runnable::run);
    }

    private void forgetWhatIsGone() {
        Set<String> selected = session.selection().elementIds();
        if (isCurrent() && !selected.isEmpty()) {
            Set<String> known = index().known(selected);
            if (known.size() < selected.size()) {
                select(known, this);
            }
        }
    }

    /** Whether the session is about this editor's file; another file may have the same ids. */
    private boolean isCurrent() {
        return getModelFile().equals(session.modelFile());
    }

    private void checked() {
        if (isClosed() || model() == null) {
            return;
        }
        checkLine.refresh();
        pages.findingsChanged();
        if (outline != null) {
            outline.findingsChanged();
        }
    }

    private void sessionChanged(AuditSession.Change change) {
        if (change != AuditSession.Change.SELECTION || model() == null || isClosed() || !isCurrent()) {
            return;
        }
        Set<String> ids = session.selection().elementIds();
        if (session.selectionSource() != activePage()) {
            activePage().select(ids);
        }
        if (outline != null && session.selectionSource() != outline) {
            outline.select(ids);
        }
        ((ObjectSelections) getSite().getSelectionProvider()).publish(selected());
        actions.update();
    }

    @Override
    public boolean isDirty() {
        return open != null && open.isDirty();
    }

    @Override
    public void doSave(IProgressMonitor monitor) {
        save(getModelFile(), monitor);
    }

    private boolean save(IFile target, IProgressMonitor monitor) {
        boolean done = file.save(target, monitor);
        if (done) {
            open.saved();
            firePropertyChange(PROP_DIRTY);
        }
        return done;
    }

    @Override
    public boolean isSaveAsAllowed() {
        return model() != null;
    }

    @Override
    public void doSaveAs() {
        IFile target = file.askForFile();
        if (target != null && save(target, null)) {
            moveTo(target);
        }
    }

    /** Goes on with another file that holds the same model. */
    void moveTo(IFile target) {
        setInputWithNotify(new FileEditorInput(target));
        setPartName(target.getName());
        file.watch();
        List.copyOf(modelListeners).forEach(Runnable::run);
    }

    void close() {
        getSite().getPage().closeEditor(this, false);
    }

    /** Reads the file anew; what was not saved is lost. */
    void reload() {
        int active = getActivePage();
        reloading = true;
        try {
            while (getPageCount() > 0) {
                removePage(getPageCount() - 1);
            }
            pages.clear();
            open.dispose();
            load();
            createPages();
        } finally {
            reloading = false;
        }
        int shown = Math.min(Math.max(0, active), getPageCount() - 1);
        setActivePage(shown);
        pages.shown(shown, selectedIds());
        firePropertyChange(PROP_DIRTY);
        if (model() != null) {
            forgetWhatIsGone();
        }
        if (outline != null) {
            outline.modelChanged();
        }
        actions.update();
        List.copyOf(modelListeners).forEach(Runnable::run);
    }

    @Override
    public void dispose() {
        file.stop();
        if (session != null) {
            session.removeListener(sessionListener);
        }
        if (checks != null) {
            checks.dispose();
        }
        if (open != null) {
            open.dispose();
        }
        super.dispose();
    }

    @Override
    public <T> T getAdapter(Class<T> type) {
        if (type == IContentOutlinePage.class) {
            if (outline == null || outline.isDisposed()) {
                outline = new StructureOutline(this);
            }
            return type.cast(outline);
        }
        if (type == IGotoMarker.class || type == StructureEditorPart.class || type == IEditingDomainProvider.class) {
            return type.cast(this);
        }
        return super.getAdapter(type);
    }

    @Override
    public void gotoMarker(IMarker marker) {
        String ids = marker.getAttribute(FindingMarkers.ELEMENT_IDS, "");
        goTo(Arrays.stream(ids.split("\n")).filter(id -> !id.isEmpty()).toList());
    }

    @Override
    public void goTo(Finding finding) {
        goTo(finding.objects().stream().map(ObjectRef::id).toList());
    }

    /** Selects what a finding is about and shows it; what is about no object is about the settings. */
    private void goTo(List<String> ids) {
        if (model() == null) {
            return;
        }
        Set<String> known = index().known(ids);
        if (known.isEmpty()) {
            showPage(model().getNodes().isEmpty() ? TablesPage.class : AnalysisPage.class);
            return;
        }
        select(known, this);
        showPageOf(ids.stream().filter(known::contains).findFirst().orElseThrow());
        activePage().select(known);
    }

    private void showPageOf(String id) {
        if (!activePage().reveals(id)) {
            showPage(object(id) instanceof LoadPattern ? LoadsPage.class : TablesPage.class);
        }
    }

    @Override
    public boolean reveal(String elementId) {
        if (model() == null || object(elementId) == null) {
            return false;
        }
        goTo(List.of(elementId));
        activePage().showProperties();
        return true;
    }

    @Override
    public IFile getModelFile() {
        return ((IFileEditorInput) getEditorInput()).getFile();
    }

    @Override
    public StructuralModel getLiveModel() {
        return model();
    }

    @Override
    public EditingDomain getEditingDomain() {
        return model() == null ? null : open.domain();
    }

    @Override
    public void addModelListener(Runnable listener) {
        modelListeners.add(listener);
    }

    @Override
    public void removeModelListener(Runnable listener) {
        modelListeners.remove(listener);
    }

    @Override
    public StructuralModel model() {
        return open == null ? null : open.model();
    }

    @Override
    public AuditSession session() {
        return session;
    }

    @Override
    public FieldContext fields() {
        return new FieldContext(open.domain(), model());
    }

    @Override
    public StructureCommands commands() {
        return new StructureCommands(open.domain(), model());
    }

    @Override
    public List<Identified> selected() {
        return model() == null || !isCurrent() ? List.of() : index().all(session.selection().elementIds());
    }

    @Override
    public Identified object(String id) {
        return model() == null ? null : index().get(id);
    }

    @Override
    public void select(Set<String> ids, Object source) {
        session.select(session.selection().withElements(ids), source);
    }

    @Override
    public void execute(Command command) {
        if (command != null && command.canExecute()) {
            open.domain().getCommandStack().execute(command);
        }
    }

    @Override
    public void delete(Collection<? extends EObject> objects) {
        if (objects.isEmpty()) {
            return;
        }
        Deletion deletion = commands().deletion(objects);
        if (!deletion.command().canExecute()) {
            return;
        }
        if (DeletionQuestion.isAgreed(shell(), objects, deletion)) {
            execute(deletion.command());
        }
    }

    @Override
    public List<Finding> findings(String id) {
        return checks.of(id);
    }

    @Override
    public Set<String> drawnIds() {
        return model() == null ? Set.of() : index().drawn();
    }

    @Override
    public void offerMenu(Control control) {
        StructureMenu.offer(control, getSite());
    }

    @Override
    public Shell shell() {
        return getSite().getShell();
    }
}
