/**
 * Draws structures into an {@code int[]} raster: camera, scene, lines with coverage anti-aliasing, triangles, text, picking.
 *
 * <p>Conventions: model axis Z is up; on the screen x runs right and y down, pixel (0, 0) is top left and pixel centres lie at +0.5;
 * colours are 0xAARRGGBB, not premultiplied; a smaller depth is nearer to the viewer. No SWT and no AWT is used, so the same code
 * draws in the workbench, in reports and on a machine without a display.
 */
package org.modewright.render;
