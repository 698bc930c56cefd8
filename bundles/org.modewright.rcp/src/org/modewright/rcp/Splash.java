package org.modewright.rcp;

import org.eclipse.jface.resource.ImageDescriptor;
import org.eclipse.swt.SWT;
import org.eclipse.swt.graphics.Image;
import org.eclipse.swt.graphics.Rectangle;
import org.eclipse.swt.widgets.Display;
import org.eclipse.swt.widgets.Label;
import org.eclipse.swt.widgets.Shell;
import org.osgi.framework.Bundle;
import org.osgi.framework.FrameworkUtil;

/** The picture that is shown while the workbench starts. */
final class Splash {

    private final Shell shell;

    private Splash(Shell shell) {
        this.shell = shell;
    }

    /** Shows the picture in the middle of the screen. */
    static Splash show(Display display) {
        Bundle bundle = FrameworkUtil.getBundle(Splash.class);
        Image image = ImageDescriptor.createFromURL(bundle.getEntry("branding/splash.png")).createImage(display);
        Shell shell = new Shell(display, SWT.NO_TRIM | SWT.ON_TOP);
        Label picture = new Label(shell, SWT.NONE);
        picture.setImage(image);
        picture.setBounds(image.getBounds());
        shell.addListener(SWT.Dispose, event -> image.dispose());
        shell.setSize(image.getBounds().width, image.getBounds().height);
        Rectangle screen = display.getPrimaryMonitor().getBounds();
        shell.setLocation(screen.x + (screen.width - shell.getSize().x) / 2, screen.y + (screen.height - shell.getSize().y) / 2);
        shell.open();
        shell.update();
        return new Splash(shell);
    }

    /** Takes the picture away; a second call does nothing. */
    void close() {
        if (!shell.isDisposed()) {
            shell.dispose();
        }
    }
}
