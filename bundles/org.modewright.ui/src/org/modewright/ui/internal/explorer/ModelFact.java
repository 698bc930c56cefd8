package org.modewright.ui.internal.explorer;

import org.eclipse.core.resources.IFile;

/**
 * One line below a model in the explorer.
 *
 * @param file the model's file
 * @param text what is to be known about it
 * @param icon name of the icon
 */
public record ModelFact(IFile file, String text, String icon) {
}
