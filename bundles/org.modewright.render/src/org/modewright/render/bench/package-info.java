/** Measures how fast the renderer draws. */
package org.modewright.render.bench;
