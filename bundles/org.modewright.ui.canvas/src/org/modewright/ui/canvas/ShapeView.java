package org.modewright.ui.canvas;

import java.nio.file.Path;
import java.util.Objects;
import java.util.Set;
import org.eclipse.core.resources.IFile;
import org.eclipse.jface.action.Action;
import org.eclipse.jface.action.IAction;
import org.eclipse.jface.action.IMenuManager;
import org.eclipse.jface.action.IToolBarManager;
import org.eclipse.jface.action.MenuManager;
import org.eclipse.jface.action.Separator;
import org.eclipse.osgi.util.NLS;
import org.eclipse.swt.SWT;
import org.eclipse.swt.custom.StackLayout;
import org.eclipse.swt.layout.GridData;
import org.eclipse.swt.layout.GridLayout;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Control;
import org.eclipse.swt.widgets.Event;
import org.eclipse.ui.IActionBars;
import org.eclipse.ui.IMemento;
import org.eclipse.ui.IViewSite;
import org.eclipse.ui.PartInitException;
import org.eclipse.ui.actions.ActionFactory;
import org.eclipse.ui.part.ViewPart;
import org.modewright.modal.Dominance.Energy;
import org.modewright.modal.ModalResult;
import org.modewright.model.structure.StructuralModel;
import org.modewright.render.ColourRamp;
import org.modewright.ui.AuditSelection;
import org.modewright.ui.AuditSession;
import org.modewright.ui.AuditSession.Change;
import org.modewright.ui.canvas.drawing.StructureDrawing;
import org.modewright.ui.widgets.EmptyState;
import org.modewright.ui.widgets.Images;
import org.modewright.ui.widgets.SentenceBar;
import org.modewright.ui.widgets.SessionPage;

/** What does a mode do? A sentence, then the structure moving in it with its rest position behind, coloured by energy on request. */
public final class ShapeView extends ViewPart {

    private static final String COLOUR_KEY = "colour";
    private static final String NOT_IN_FILE_NAMES = "[\\\\/:*?\"<>|]";

    private final ColourRamp ramp = ColourRamp.energy();
    private AuditSession session;
    private SessionPage page;
    private SentenceBar sentence;
    private final StackLayout stack = new StackLayout();
    private Composite stage;
    private Composite moving;
    private EmptyState noMode;
    private StructureCanvas canvas;
    private EnergyLegend legend;
    private ShapePlayer player;
    private PictureActions pictures;
    private IAction playAction;
    private Energy colouring = Energy.STRAIN;
    private StructuralModel drawnModel;
    private IFile drawnFile;
    private ModalResult shownResult;
    private int shownMode = -1;
    private boolean shapeShown;

    @Override
    public void init(IViewSite site, IMemento saved) throws PartInitException {
        super.init(site, saved);
        String colour = saved == null ? null : saved.getString(COLOUR_KEY);
        if (colour != null) {
            colouring = colour.equals(Energy.STRAIN.name()) ? Energy.STRAIN : colour.equals(Energy.KINETIC.name()) ? Energy.KINETIC : null;
        }
    }

    @Override
    public void saveState(IMemento memento) {
        memento.putString(COLOUR_KEY, colouring == null ? "NONE" : colouring.name());
    }

    @Override
    public void createPartControl(Composite parent) {
        session = getSite().getService(AuditSession.class);
        page = new SessionPage(parent, session);
        Composite content = page.content();
        content.setLayout(plain());
        sentence = new SentenceBar(content);
        sentence.setLayoutData(new GridData(SWT.FILL, SWT.TOP, true, false));
        stage = new Composite(content, SWT.NONE);
        stage.setLayoutData(new GridData(SWT.FILL, SWT.FILL, true, true));
        stage.setLayout(stack);
        noMode = new EmptyState(stage);
        createMoving();
        stack.topControl = noMode;
        contributeActions();
        AuditSession.Listener listener = this::changed;
        session.addListener(listener);
        page.addListener(SWT.Dispose, event -> session.removeListener(listener));
        showAll();
    }

    private void createMoving() {
        moving = new Composite(stage, SWT.NONE);
        moving.setLayout(plain());
        canvas = new StructureCanvas(moving, new Bridge());
        canvas.setLayoutData(new GridData(SWT.FILL, SWT.FILL, true, true));
        canvas.describeWith(object -> shownResult == null ? ObjectFacts.of(object) : ObjectFacts.of(object, shownResult, shownMode));
        canvas.options().labels(false);
        canvas.addListener(SWT.KeyDown, this::key);
        legend = new EnergyLegend(canvas, ramp);
        canvas.overlayWith(legend::paint);
        player = new ShapePlayer(canvas, moving, this::showPlaying);
        pictures = new PictureActions(getSite().getShell(), canvas, legend);
    }

    private static GridLayout plain() {
        GridLayout layout = new GridLayout();
        layout.marginWidth = 0;
        layout.marginHeight = 0;
        layout.verticalSpacing = 0;
        return layout;
    }

    @Override
    public void setFocus() {
        if (page.hasContent()) {
            stack.topControl.setFocus();
        } else {
            page.setFocus();
        }
    }

    /** The canvas. */
    public StructureCanvas canvas() {
        return canvas;
    }

    /** Whether the shape plays. */
    public boolean isPlaying() {
        return player.isPlaying();
    }

    /** Phase of the movement, rad; 0 without a shape. */
    public double phase() {
        return player.phase();
    }

    private void contributeActions() {
        IActionBars bars = getViewSite().getActionBars();
        IToolBarManager tools = bars.getToolBarManager();
        IAction previous = ViewActions.command(Messages.Shape_previous, Images.PREVIOUS, () -> moveMode(-1));
        IAction next = ViewActions.command(Messages.Shape_next, Images.NEXT, () -> moveMode(1));
        playAction = ViewActions.command(Messages.Shape_play, Images.PLAY, player::toggle);
        IAction back = ViewActions.command(Messages.Shape_stepBack, Images.STEP_BACK, player::stepBack);
        IAction forward = ViewActions.command(Messages.Shape_stepForward, Images.STEP_FORWARD, player::stepForward);
        tools.add(previous);
        tools.add(playAction);
        tools.add(next);
        tools.add(new Separator());
        ViewActions.views(canvas).stream().filter(action -> !action.getText().equals(Messages.View_side)).forEach(tools::add);
        IAction save = ViewActions.command(Messages.Shape_save, Images.CAMERA, this::savePicture);
        tools.add(new Separator());
        tools.add(save);
        IMenuManager menu = bars.getMenuManager();
        menu.add(back);
        menu.add(forward);
        menu.add(new Separator());
        addColours(menu);
        addViews(menu);
        IAction copy = ViewActions.command(Messages.Shape_copy, Images.COPY, this::copyPicture);
        menu.add(new Separator());
        menu.add(save);
        menu.add(copy);
        bars.setGlobalActionHandler(ActionFactory.COPY.getId(), copy);
    }

    private void addColours(IMenuManager menu) {
        MenuManager colours = new MenuManager(Messages.Shape_colour);
        colours.add(colourAction(Messages.Shape_colourNone, null));
        colours.add(colourAction(Messages.Shape_colourStrain, Energy.STRAIN));
        colours.add(colourAction(Messages.Shape_colourKinetic, Energy.KINETIC));
        menu.add(colours);
    }

    private void addViews(IMenuManager menu) {
        MenuManager views = new MenuManager(Messages.Shape_views);
        ViewActions.views(canvas).forEach(views::add);
        menu.add(views);
        menu.add(ViewActions.toggle(canvas, Messages.Shape_ghost, Images.GHOST, () -> canvas.options().ghost(),
                on -> canvas.options().ghost(on)));
        ViewActions.options(canvas).forEach(menu::add);
    }

    private IAction colourAction(String label, Energy energy) {
        Action action = new Action(label, IAction.AS_RADIO_BUTTON) {
            @Override
            public void run() {
                if (isChecked()) {
                    colouring = energy;
                    colour();
                    canvas.redraw();
                }
            }
        };
        action.setChecked(colouring == energy);
        return action;
    }

    private void changed(Change change) {
        if (change == Change.MODEL) {
            drawnModel = null;
        }
        if (change != Change.RUNNING) {
            showAll();
        } else {
            sentence.setStale(session.isStale(), session::run);
        }
    }

    private void showAll() {
        sentence.setStale(session.isStale(), session::run);
        if (session.result() == null) {
            stopShape();
            return;
        }
        if (session.model() == null) {
            showNothing(Messages.Shape_noModel, null, null);
            return;
        }
        ModalResult result = session.result().modal();
        drawModel();
        int mode = session.selection().mode();
        if (mode < 0 || mode >= result.modes().size()) {
            showNoMode(result);
        } else if (result != shownResult || mode != shownMode || !shapeShown) {
            showMode(result, mode);
        }
        canvas.select(session.selection().elementIds());
    }

    private void stopShape() {
        shownResult = null;
        shownMode = -1;
        shapeShown = false;
        player.show(null);
    }

    private void drawModel() {
        StructuralModel model = session.model();
        if (model != drawnModel) {
            drawnModel = model;
            canvas.show(StructureDrawing.of(model), Objects.equals(drawnFile, session.modelFile()));
            drawnFile = session.modelFile();
            shapeShown = false;
        }
    }

    private void showNoMode(ModalResult result) {
        boolean any = !result.modes().isEmpty();
        showNothing(any ? Messages.Shape_noMode : Messages.Shape_noModes, any ? Messages.Shape_selectFirst : null,
                any ? () -> selectMode(0) : null);
    }

    private void showNothing(String why, String link, Runnable action) {
        stopShape();
        sentence.show(SentenceBar.Sign.NONE, "");
        noMode.show(why, link, action);
        top(noMode);
    }

    private void showMode(ModalResult result, int mode) {
        shownResult = result;
        shownMode = mode;
        sentence.show(SentenceBar.Sign.INFORMATION, ShapeSentence.of(result, mode));
        shapeShown = true;
        colour();
        top(moving);
        player.show(canvas.drawing().deformation(result, mode));
    }

    private void colour() {
        if (shownMode >= 0 && canvas.drawing() != null) {
            legend.show(colouring, canvas.drawing().colour(shownResult, shownMode, colouring, ramp));
        }
    }

    private void top(Control control) {
        if (stack.topControl != control) {
            stack.topControl = control;
            stage.layout(true, true);
        }
    }

    private void selectMode(int mode) {
        session.select(AuditSelection.ofMode(session.result().modal(), mode), this);
    }

    private void moveMode(int by) {
        if (session.result() != null && !session.result().modal().modes().isEmpty()) {
            int last = session.result().modal().modes().size() - 1;
            selectMode(Math.max(0, Math.min(last, session.selection().mode() + by)));
        }
    }

    private void key(Event event) {
        switch (event.character) {
            case ' ' -> player.toggle();
            case '.' -> player.stepForward();
            case ',' -> player.stepBack();
            case 'n', 'N' -> moveMode(1);
            case 'p', 'P' -> moveMode(-1);
            default -> {
                return;
            }
        }
    }

    private boolean showsShape() {
        return canvas.hasScene() && shownMode >= 0;
    }

    private void savePicture() {
        if (showsShape()) {
            String name = NLS.bind(Messages.Shape_fileName, shownResult.modelName(), shownResult.modes().get(shownMode).number());
            pictures.save(name.replaceAll(NOT_IN_FILE_NAMES, "-"));
        }
    }

    /** Writes the present picture as PNG; what goes wrong is told in a dialogue. */
    public void savePicture(Path file) {
        pictures.save(file);
    }

    private void copyPicture() {
        if (showsShape()) {
            pictures.copy();
        }
    }

    private void showPlaying(boolean plays) {
        playAction.setImageDescriptor(Images.descriptor(plays ? Images.PAUSE : Images.PLAY));
        playAction.setToolTipText(plays ? Messages.Shape_pause : Messages.Shape_play);
    }

    /** What is picked here is selected everywhere. */
    private final class Bridge implements StructureCanvas.Handler {

        @Override
        public void picked(Set<String> ids, boolean add) {
            PickedSelection.apply(session, ids, add, ShapeView.this);
        }

        @Override
        public void opened(String id) {
            session.revealProperties(id);
        }
    }
}
