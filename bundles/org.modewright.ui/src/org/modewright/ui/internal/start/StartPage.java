package org.modewright.ui.internal.start;

import java.util.List;
import org.eclipse.core.resources.IFile;
import org.eclipse.core.resources.ResourcesPlugin;
import org.eclipse.core.runtime.ILog;
import org.eclipse.core.runtime.IProgressMonitor;
import org.eclipse.jface.dialogs.MessageDialog;
import org.eclipse.jface.layout.GridDataFactory;
import org.eclipse.jface.layout.GridLayoutFactory;
import org.eclipse.jface.resource.FontDescriptor;
import org.eclipse.jface.resource.JFaceResources;
import org.eclipse.jface.resource.LocalResourceManager;
import org.eclipse.osgi.util.NLS;
import org.eclipse.swt.SWT;
import org.eclipse.swt.custom.ScrolledComposite;
import org.eclipse.swt.graphics.Font;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.layout.GridLayout;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swt.widgets.Label;
import org.eclipse.swt.widgets.Link;
import org.eclipse.ui.IEditorInput;
import org.eclipse.ui.IEditorReference;
import org.eclipse.ui.IEditorSite;
import org.eclipse.ui.IPartListener2;
import org.eclipse.ui.IWorkbenchPage;
import org.eclipse.ui.IWorkbenchPartReference;
import org.eclipse.ui.PartInitException;
import org.eclipse.ui.ide.IDE;
import org.eclipse.ui.part.EditorPart;
import org.modewright.ui.UiIds;
import org.modewright.ui.internal.Actions;
import org.modewright.ui.internal.Messages;
import org.modewright.ui.internal.RecentModels;
import org.modewright.ui.widgets.Images;
import org.modewright.ui.widgets.ThemeColours;

/** Where a session of work begins: a new project, an import, the sample, or a recent model; with the caution, once and briefly. */
public final class StartPage extends EditorPart {

    private static final int MARGIN = 32;
    private static final int COLUMN = 260;
    private static final int WIDEST = 900;

    private final IPartListener2 otherEditors = new OtherEditors();

    private LocalResourceManager resources;
    private Composite recent;
    private ScrolledComposite scroller;
    private Composite page;
    private Composite head;
    private Composite foot;
    private Label rule;

    /** Opens the start page or brings it to the front. */
    public static void open(IWorkbenchPage page) {
        try {
            page.openEditor(new StartPageInput(), UiIds.START_PAGE);
        } catch (PartInitException failure) {
            ILog.of(StartPage.class).error("The start page could not be opened.", failure);
        }
    }

    @Override
    public void init(IEditorSite site, IEditorInput input) {
        setSite(site);
        setInput(input);
        setPartName(Messages.StartPage_title);
    }

    @Override
    public void createPartControl(Composite parent) {
        resources = new LocalResourceManager(JFaceResources.getResources(), parent);
        scroller = new ScrolledComposite(parent, SWT.V_SCROLL | SWT.H_SCROLL);
        scroller.setExpandHorizontal(true);
        scroller.setExpandVertical(true);
        Composite sheet = new Composite(scroller, SWT.NONE);
        GridLayoutFactory.fillDefaults().margins(MARGIN, MARGIN).applyTo(sheet);
        sheet.setBackgroundMode(SWT.INHERIT_FORCE);
        page = new Composite(sheet, SWT.NONE);
        GridLayoutFactory.fillDefaults().numColumns(2).spacing(32, 16).applyTo(page);
        GridDataFactory.fillDefaults().align(SWT.CENTER, SWT.BEGINNING).grab(true, true).applyTo(page);
        createHead();
        createBegin();
        createRecent();
        createFoot();
        scroller.setContent(sheet);
        scroller.addListener(SWT.Resize, event -> fit());
        fit();
        getSite().getPage().addPartListener(otherEditors);
        parent.getDisplay().asyncExec(this::fillEmptyWindow);
    }

    @Override
    public void dispose() {
        getSite().getPage().removePartListener(otherEditors);
        super.dispose();
    }

    /** Without a project there is nothing else to look at: the page takes the whole window. */
    private void fillEmptyWindow() {
        IWorkbenchPage window = getSite().getPage();
        boolean alone = window.getEditorReferences().length == 1 && ResourcesPlugin.getWorkspace().getRoot().getProjects().length == 0;
        if (alone && !scroller.isDisposed()) {
            window.setPartState(window.getReference(this), IWorkbenchPage.STATE_MAXIMIZED);
        }
    }

    private void giveWay() {
        IWorkbenchPage window = getSite().getPage();
        IWorkbenchPartReference reference = window.getReference(this);
        if (reference != null && window.getPartState(reference) == IWorkbenchPage.STATE_MAXIMIZED) {
            window.setPartState(reference, IWorkbenchPage.STATE_RESTORED);
        }
    }

    @Override
    public void setFocus() {
        refreshRecent();
        page.setFocus();
    }

    @Override
    public void doSave(IProgressMonitor monitor) {
        throw new UnsupportedOperationException("The start page is never dirty.");
    }

    @Override
    public void doSaveAs() {
        throw new UnsupportedOperationException("The start page is never dirty.");
    }

    @Override
    public boolean isDirty() {
        return false;
    }

    @Override
    public boolean isSaveAsAllowed() {
        return false;
    }

    private void createHead() {
        head = new Composite(page, SWT.NONE);
        GridLayoutFactory.fillDefaults().numColumns(2).spacing(24, 4).applyTo(head);
        GridDataFactory.fillDefaults().span(2, 1).grab(true, false).applyTo(head);
        Composite words = new Composite(head, SWT.NONE);
        GridLayoutFactory.fillDefaults().spacing(0, 8).applyTo(words);
        GridDataFactory.fillDefaults().grab(true, false).align(SWT.FILL, SWT.CENTER).applyTo(words);
        Label name = new Label(words, SWT.NONE);
        name.setText(Messages.StartPage_product);
        name.setFont(font(2.4, SWT.NORMAL));
        Label purpose = wrapped(words, Messages.StartPage_purpose);
        purpose.setForeground(ThemeColours.secondaryText(page));
        SwayingFrame picture = new SwayingFrame(head);
        GridDataFactory.fillDefaults().hint(200, 136).align(SWT.END, SWT.CENTER).applyTo(picture);
    }

    private void createBegin() {
        Composite begin = column(Messages.StartPage_begin);
        card(begin, Images.SAMPLE, Messages.StartPage_sample, Messages.StartPage_sampleText, UiIds.OPEN_SAMPLE_COMMAND, "start.sample");
        card(begin, Images.NEW_PROJECT, Messages.StartPage_new, Messages.StartPage_newText, UiIds.NEW_PROJECT_COMMAND, "start.new");
        card(begin, Images.IMPORT, Messages.StartPage_import, Messages.StartPage_importText, UiIds.IMPORT_COMMAND, "start.import");
    }

    private void createRecent() {
        recent = column(Messages.StartPage_recent);
        fillRecent();
    }

    private void createFoot() {
        rule = new Label(page, SWT.SEPARATOR | SWT.HORIZONTAL);
        GridDataFactory.fillDefaults().span(2, 1).indent(0, 8).applyTo(rule);
        foot = new Composite(page, SWT.NONE);
        GridLayoutFactory.fillDefaults().numColumns(2).spacing(8, 8).applyTo(foot);
        GridDataFactory.fillDefaults().span(2, 1).grab(true, false).applyTo(foot);
        Label sign = new Label(foot, SWT.NONE);
        sign.setImage(resources.get(Images.descriptor(Images.WARNING)));
        GridDataFactory.swtDefaults().align(SWT.BEGINNING, SWT.BEGINNING).applyTo(sign);
        Label caution = wrapped(foot, Messages.StartPage_caution);
        caution.setData(UiIds.WIDGET_ID, "start.caution");
        new Label(foot, SWT.NONE);
        Label kernel = wrapped(foot, NLS.bind(Messages.StartPage_kernel, Runtime.version().feature(),
                Runtime.getRuntime().availableProcessors()));
        kernel.setForeground(ThemeColours.secondaryText(page));
    }

    private Composite column(String title) {
        Composite column = new Composite(page, SWT.NONE);
        GridLayoutFactory.fillDefaults().spacing(0, 8).applyTo(column);
        GridDataFactory.fillDefaults().grab(true, true).hint(COLUMN, SWT.DEFAULT).applyTo(column);
        Label heading = new Label(column, SWT.NONE);
        heading.setText(title);
        heading.setFont(font(1.25, SWT.BOLD));
        return column;
    }

    private void card(Composite column, String icon, String title, String text, String command, String id) {
        StartCard card = new StartCard(column, resources.get(Images.descriptor(icon)), title, text, () -> Actions.execute(command));
        card.setData(UiIds.WIDGET_ID, id);
        GridDataFactory.fillDefaults().grab(true, false).applyTo(card);
    }

    private void fillRecent() {
        List<IFile> models = new RecentModels().list();
        if (models.isEmpty()) {
            Label none = wrapped(recent, Messages.StartPage_noRecent);
            none.setForeground(ThemeColours.secondaryText(page));
        }
        for (IFile model : models) {
            Link link = new Link(recent, SWT.NONE);
            link.setText("<a>" + model.getName() + "</a>   " + model.getProject().getName());
            link.setToolTipText(model.getFullPath().toString());
            link.addListener(SWT.Selection, event -> open(model));
            GridDataFactory.fillDefaults().grab(true, false).applyTo(link);
        }
    }

    private void refreshRecent() {
        for (int i = recent.getChildren().length - 1; i > 0; i--) {
            recent.getChildren()[i].dispose();
        }
        fillRecent();
        page.layout(true, true);
        fit();
    }

    private void open(IFile model) {
        try {
            IDE.openEditor(getSite().getPage(), model, true);
        } catch (PartInitException failure) {
            MessageDialog.openError(getSite().getShell(), Messages.Session_notOpened, failure.getMessage());
        }
    }

    private void fit() {
        int room = scroller.getClientArea().width;
        int width = Math.max(COLUMN, Math.min(WIDEST, room - 2 * MARGIN));
        GridLayout columns = (GridLayout) page.getLayout();
        int number = width < 2 * COLUMN + columns.horizontalSpacing ? 1 : 2;
        if (columns.numColumns != number) {
            columns.numColumns = number;
            for (Control wide : List.of(head, rule, foot)) {
                ((GridData) wide.getLayoutData()).horizontalSpan = number;
            }
        }
        ((GridData) page.getLayoutData()).widthHint = width;
        scroller.setMinSize(page.getParent().computeSize(Math.max(room, width + 2 * MARGIN), SWT.DEFAULT));
        page.getParent().layout(true, true);
    }

    /** Gives way to the first model that is opened. */
    private final class OtherEditors implements IPartListener2 {

        @Override
        public void partOpened(IWorkbenchPartReference reference) {
            if (reference instanceof IEditorReference && reference.getPart(false) != StartPage.this) {
                giveWay();
            }
        }
    }

    private static Label wrapped(Composite parent, String text) {
        Label label = new Label(parent, SWT.WRAP);
        label.setText(text);
        GridDataFactory.fillDefaults().grab(true, false).hint(COLUMN, SWT.DEFAULT).applyTo(label);
        return label;
    }

    private Font font(double factor, int style) {
        FontDescriptor standard = JFaceResources.getDefaultFontDescriptor();
        int height = (int) Math.round(standard.getFontData()[0].getHeight() * factor);
        return resources.create(standard.setHeight(height).setStyle(style));
    }
}
