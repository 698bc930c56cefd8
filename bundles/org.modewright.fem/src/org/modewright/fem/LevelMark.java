package org.modewright.fem;

/**
 * A level (storey).
 *
 * @param id stable id in the model
 * @param name name for people
 * @param elevation height above the origin, m
 */
public record LevelMark(String id, String name, double elevation) {
}
