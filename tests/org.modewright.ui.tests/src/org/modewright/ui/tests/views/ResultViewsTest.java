package org.modewright.ui.tests.views;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import org.eclipse.swt.SWT;
import org.eclipse.swt.dnd.Clipboard;
import org.eclipse.swt.dnd.TextTransfer;
import org.eclipse.swt.graphics.ImageData;
import org.eclipse.swt.graphics.Point;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.extension.ExtendWith;
import org.junit.jupiter.api.io.TempDir;
import org.modewright.fem.Carrier;
import org.modewright.modal.Direction;
import org.modewright.modal.Dominance;
import org.modewright.modal.Dominance.Energy;
import org.modewright.modal.Dominance.RollUp;
import org.modewright.modal.ModalResult;
import org.modewright.modal.Mode;
import org.modewright.testsupport.TableObject;
import org.modewright.testsupport.ViewObject;
import org.modewright.testsupport.Workbench;
import org.modewright.testsupport.WorkbenchExtension;
import org.modewright.ui.AuditSession;
import org.modewright.ui.UiIds;
import org.modewright.ui.canvas.ShapeView;

/** The views of a result on the demonstration model: what a user does in one of them is seen in all. */
@ExtendWith(WorkbenchExtension.class)
class ResultViewsTest {

    private static final String COPY = "org.eclipse.ui.edit.copy";

    private Workbench workbench;
    private AuditSession session;
    private ModalResult modal;

    @BeforeEach
    void runTheDemonstration(Workbench running) {
        workbench = running;
        workbench.openSample();
        workbench.runAudit();
        session = workbench.session();
        modal = workbench.ask(() -> session.result().modal());
        forgetEarlierChoices();
    }

    /** The views outlive a test: all modes in their order, elements ranked, the first tabs in front. */
    private void forgetEarlierChoices() {
        ViewObject modes = workbench.view(UiIds.MODES_VIEW);
        modes.choose("modes.filter", "all modes");
        modes.table("modes.table").clickHeader("X %");
        modes.table("modes.table").clickHeader("Mode");
        workbench.view(UiIds.CAPTURE_VIEW).chooseTab("capture.tabs", 0);
        workbench.view(UiIds.DOMINANCE_VIEW).chooseTab("dominance.tabs", 0);
        workbench.view(UiIds.DOMINANCE_VIEW).chooseMenu(RollUp.ELEMENT.name());
    }

    @AfterEach
    void leaveTheViewsAsTheyWere() {
        forgetEarlierChoices();
        ShapeView shape = (ShapeView) workbench.view(UiIds.SHAPE_VIEW).part();
        if (workbench.ask(() -> shape.canvas().isVisible() && !shape.isPlaying())) {
            workbench.view(UiIds.SHAPE_VIEW).press("canvas", ' ', ' ');
        }
    }

    private int selectedMode() {
        return workbench.ask(() -> session.selection().mode());
    }

    private TableObject modesTable() {
        return workbench.view(UiIds.MODES_VIEW).table("modes.table").waitForRows();
    }

    @Test
    void aClickOnAHeaderSortsAndTheSelectedModeIsTheOneOfItsRow() {
        TableObject table = modesTable();
        table.clickHeader("X %");
        int leading = IntStream.range(0, modal.modes().size()).boxed()
                .max((a, b) -> Double.compare(share(a, Direction.X), share(b, Direction.X))).orElseThrow();
        assertTrue(table.text(0, "Mode").endsWith(Integer.toString(leading + 1)), table.row(0).toString());
        table.select(0);
        assertEquals(leading, selectedMode());
        table.clickHeader("X %");
        assertEquals(List.of(modal.modes().size() - 1), table.selection(), "the same mode is the last row when the order turns");
    }

    private double share(int mode, Direction direction) {
        return modal.modes().get(mode).effectiveMassShare(direction);
    }

    @Test
    void theFilterKeepsLocalModesAndSaysHowMany() {
        ViewObject modes = workbench.view(UiIds.MODES_VIEW);
        long local = modal.modes().stream().filter(Mode::isLocal).count();
        modesTable();
        modes.choose("modes.filter", "local modes");
        assertEquals(local, modes.table("modes.table").rowCount());
        assertEquals(local + " of " + modal.modes().size() + " modes", modes.text("modes.filter.count"));
    }

    @Test
    void rowsAreCopiedWithTheirHeaderInFullPrecision() {
        TableObject table = modesTable();
        table.select(2);
        workbench.execute(COPY);
        String[] lines = workbench.ask(this::clipboard).split("\n");
        assertEquals(2, lines.length);
        assertTrue(lines[0].startsWith("Mode\tT s\tf Hz\t"), lines[0]);
        assertEquals(Double.toString(modal.modes().get(2).period()), lines[1].split("\t")[1]);
    }

    private String clipboard() {
        Clipboard clipboard = new Clipboard(workbench.ui().display());
        try {
            return (String) clipboard.getContents(TextTransfer.getInstance());
        } finally {
            clipboard.dispose();
        }
    }

    @Test
    void aClickOnTheStaircaseSelectsAModeAndTheArrowsGoOn() {
        ViewObject capture = workbench.view(UiIds.CAPTURE_VIEW);
        capture.click("capture.plot", 0.4, 0.5);
        int picked = selectedMode();
        assertTrue(picked > 0 && picked < modal.modes().size() - 1, "mode " + picked);
        assertEquals(1, modesTable().selection().size(), "the table follows");
        capture.press("capture.plot", (char) 0, SWT.ARROW_RIGHT);
        assertEquals(picked + 1, selectedMode());
        capture.press("capture.plot", (char) 0, SWT.HOME);
        assertEquals(0, selectedMode());
    }

    @Test
    void theLedgerStandsBesideTheStaircase() {
        ViewObject capture = workbench.view(UiIds.CAPTURE_VIEW);
        capture.chooseTab("capture.tabs", 1);
        TableObject masses = capture.table("capture.masses").waitForRows();
        assertEquals("Can move", masses.row(0).get(0));
        assertEquals(4 + 2 * modal.mass().sources().size(), masses.rowCount());
    }

    @Test
    void keysPlayStepAndTurnTheShape() {
        modesTable().select(0);
        ViewObject shape = workbench.view(UiIds.SHAPE_VIEW);
        ShapeView view = (ShapeView) shape.part();
        workbench.ui().waitUntil("the shape to move", () -> view.isPlaying() && view.canvas().frames() > 2);
        shape.press("canvas", ' ', ' ');
        assertFalse(workbench.ask(view::isPlaying));
        double phase = workbench.ask(view::phase);
        shape.press("canvas", '.', '.');
        assertEquals(phase + 2 * Math.PI / 24, workbench.ask(view::phase), 1e-9);
        shape.press("canvas", ',', ',');
        assertEquals(phase, workbench.ask(view::phase), 1e-9);
        int[] inSpace = settledPixels(view);
        shape.press("canvas", '3', '3');
        workbench.ui().waitUntil("another picture", () -> !Arrays.equals(inSpace, view.canvas().pixels()));
        shape.press("canvas", 'n', 'n');
        assertEquals(1, selectedMode());
        shape.press("canvas", 'p', 'p');
        assertEquals(0, selectedMode());
        shape.press("canvas", (char) 0, SWT.ESC);
        assertEquals(Set.of(), workbench.ask(() -> session.selection().elementIds()));
    }

    @Test
    void aClickInSpacePicksWhatLiesThere() {
        modesTable().select(0);
        ViewObject shape = workbench.view(UiIds.SHAPE_VIEW);
        ShapeView view = (ShapeView) shape.part();
        workbench.ui().waitUntil("the shape", () -> view.canvas().frames() > 0);
        shape.press("canvas", ' ', ' ');
        settledPixels(view);
        Point size = workbench.ask(() -> view.canvas().getSize());
        int x = IntStream.range(0, size.x).filter(at -> idInTheMiddle(view, at, size.y) != null).findFirst().orElseThrow();
        String there = idInTheMiddle(view, x, size.y);
        shape.click("canvas", (x + 0.5) / size.x, 0.5);
        assertEquals(Set.of(there), workbench.ask(() -> session.selection().elementIds()));
        assertEquals(0, selectedMode(), "the mode stays selected");
    }

    private String idInTheMiddle(ShapeView view, int x, int height) {
        return workbench.ask(() -> view.canvas().idAt(x, height / 2));
    }

    /** The picture once it stands still. */
    private int[] settledPixels(ShapeView view) {
        int[][] last = {workbench.ask(() -> view.canvas().pixels())};
        workbench.ui().waitUntil("the picture to stand still", () -> {
            int[] before = last[0];
            last[0] = view.canvas().pixels();
            return Arrays.equals(before, last[0]);
        });
        return last[0];
    }

    @Test
    void thePictureIsSavedWithItsLegend(@TempDir Path folder) throws Exception {
        modesTable().select(0);
        ShapeView view = (ShapeView) workbench.view(UiIds.SHAPE_VIEW).part();
        workbench.ui().waitUntil("the shape", () -> view.canvas().frames() > 0);
        Path file = folder.resolve("mode 1.png");
        workbench.ui().run(() -> view.savePicture(file));
        assertArrayEquals(new byte[] {(byte) 0x89, 'P', 'N', 'G'}, Arrays.copyOf(Files.readAllBytes(file), 4));
        ImageData picture = workbench.ask(() -> new ImageData(file.toString()));
        assertEquals(1920, picture.width);
        Set<Integer> colours = new HashSet<>();
        for (int y = 0; y < picture.height / 2; y += 2) {
            for (int x = picture.width * 9 / 10; x < picture.width; x += 2) {
                colours.add(picture.getPixel(x, y));
            }
        }
        assertTrue(colours.size() > 100, "the ramp stands at the right, its colours: " + colours.size());
    }

    @Test
    void aGroupPickedInDominanceSelectsAllItsElements() {
        modesTable().select(0);
        ViewObject dominance = workbench.view(UiIds.DOMINANCE_VIEW);
        dominance.chooseMenu(RollUp.GROUP.name());
        TableObject ranking = dominance.table("dominance.table");
        Dominance.Share first = new Dominance(modal).ranked(0, Energy.STRAIN, RollUp.GROUP).get(0);
        workbench.ui().waitUntil("the groups", () -> ranking.row(0).contains(first.label()));
        ranking.select(0);
        Set<String> members = modal.carriers().stream().filter(carrier -> first.label().equals(carrier.group())).map(Carrier::id)
                .collect(Collectors.toSet());
        assertEquals(members, workbench.ask(() -> session.selection().elementIds()));
        assertEquals(0, selectedMode(), "the mode stays selected");
    }

    @Test
    void theModesOfTheSelectedElementsAreListedAndPicked() {
        modesTable().select(0);
        ViewObject dominance = workbench.view(UiIds.DOMINANCE_VIEW);
        dominance.table("dominance.table").waitForRows().select(0);
        Set<String> picked = workbench.ask(() -> session.selection().elementIds());
        dominance.chooseTab("dominance.tabs", 1);
        List<Dominance.ModeShare> expected = new Dominance(modal).modesOf(picked, 0.05);
        TableObject modes = dominance.table("dominance.modes");
        assertEquals(expected.size(), modes.rowCount());
        assertTrue(dominance.sentence().contains(" in " + expected.size() + " of " + modal.modes().size() + " modes"),
                dominance.sentence());
        modes.select(expected.size() - 1);
        assertEquals(expected.get(expected.size() - 1).mode(), selectedMode());
        assertEquals(picked, workbench.ask(() -> session.selection().elementIds()), "the elements stay selected");
    }

    @Test
    void openingARankedElementShowsItsProperties() {
        modesTable().select(0);
        TableObject ranking = workbench.view(UiIds.DOMINANCE_VIEW).table("dominance.table").waitForRows();
        String element = new Dominance(modal).ranked(0, Energy.STRAIN, RollUp.ELEMENT).get(0).elementId();
        ranking.open(0);
        assertEquals(Set.of(element), workbench.ask(() -> session.selection().elementIds()));
        assertTrue(workbench.editor().has("field.Name"));
    }
}
