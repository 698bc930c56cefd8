package org.modewright.ui.editor.pages;

import org.eclipse.jface.dialogs.DialogSettings;
import org.eclipse.jface.dialogs.IDialogSettings;
import org.eclipse.swt.SWT;
import org.eclipse.swt.graphics.Point;
import org.eclipse.swt.graphics.Rectangle;
import org.eclipse.swt.layout.FillLayout;
import org.eclipse.swt.widgets.Composite;
import org.eclipse.swt.widgets.Layout;
import org.eclipse.ui.PlatformUI;
import org.osgi.framework.FrameworkUtil;

/** What a page is about at the left, properties at the right that can be folded away; open or folded, and how wide, is kept. */
final class SideBySide {

    private static final int LEAST = 120;
    private static final int USUAL = 240;
    private static final String OPEN = "open";
    private static final String WIDTH = "width";

    private final Composite body;
    private final Composite main;
    private final FoldBar bar;
    private final Composite side;
    private final IDialogSettings kept;
    private int width;
    private Runnable opened = () -> { };

    /**
     * @param key name under which the state is kept
     * @param openAtFirst whether the properties are open until the user folds them away
     */
    SideBySide(Composite parent, String key, boolean openAtFirst) {
        body = new Composite(parent, SWT.NONE);
        body.setLayout(new Columns());
        main = new Composite(body, SWT.NONE);
        main.setLayout(new FillLayout());
        bar = new FoldBar(body, this::toggle, this::dragged);
        side = new Composite(body, SWT.NONE);
        side.setLayout(new FillLayout());
        kept = settings(key);
        if (kept.get(OPEN) == null) {
            kept.put(OPEN, openAtFirst);
            kept.put(WIDTH, USUAL);
        }
        width = kept.getInt(WIDTH);
        open(kept.getBoolean(OPEN));
    }

    Composite body() {
        return body;
    }

    /** Parent of the main part. */
    Composite main() {
        return main;
    }

    /** Parent of the properties. */
    Composite side() {
        return side;
    }

    boolean isOpen() {
        return side.getVisible();
    }

    /** Says what is to be done when the properties are brought back. */
    void whenOpened(Runnable action) {
        opened = action;
    }

    /** Folds the properties away or brings them back. */
    void open(boolean open) {
        kept.put(OPEN, open);
        side.setVisible(open);
        bar.show(open);
        body.layout();
        if (open) {
            opened.run();
        }
    }

    private void toggle() {
        open(!side.getVisible());
    }

    private void dragged(int x) {
        width = Math.max(LEAST, Math.min(body.getClientArea().width - LEAST, body.getClientArea().width - x - FoldBar.WIDTH));
        kept.put(WIDTH, width);
        body.layout();
    }

    private static IDialogSettings settings(String key) {
        IDialogSettings all = PlatformUI.getDialogSettingsProvider(FrameworkUtil.getBundle(SideBySide.class)).getDialogSettings();
        return DialogSettings.getOrCreateSection(all, key);
    }

    private final class Columns extends Layout {

        @Override
        protected Point computeSize(Composite composite, int widthHint, int heightHint, boolean flushCache) {
            return new Point(widthHint == SWT.DEFAULT ? 2 * USUAL : widthHint, heightHint == SWT.DEFAULT ? USUAL : heightHint);
        }

        @Override
        protected void layout(Composite composite, boolean flushCache) {
            Rectangle area = composite.getClientArea();
            if (area.isEmpty()) {
                return;
            }
            int beside = side.getVisible() ? Math.min(width, Math.max(0, area.width / 2)) : 0;
            int rest = Math.max(0, area.width - beside - FoldBar.WIDTH);
            main.setBounds(area.x, area.y, rest, area.height);
            bar.setBounds(area.x + rest, area.y, FoldBar.WIDTH, area.height);
            if (beside > 0) {
                side.setBounds(area.x + rest + FoldBar.WIDTH, area.y, beside, area.height);
            }
        }
    }
}
