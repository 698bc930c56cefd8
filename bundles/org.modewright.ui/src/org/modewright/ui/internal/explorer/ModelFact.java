package org.modewright.ui.internal.explorer;

import org.eclipse.core.resources.IFile;

/**
 * One line below a model in the explorer.
 *
 * @param file the model's file
 * @param place place among the lines of the model, from 0
 * @param text what is to be known about it
 * @param icon name of the icon
 */
public record ModelFact(IFile file, int place, String text, String icon) {
}
