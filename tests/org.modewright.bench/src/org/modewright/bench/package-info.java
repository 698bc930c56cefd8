/** The benchmark command of the command line: how fast a mode is drawn, and how fast a frame building is assembled and solved. */
package org.modewright.bench;
