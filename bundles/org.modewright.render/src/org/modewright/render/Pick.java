package org.modewright.render;

/**
 * What was found under the pointer.
 *
 * @param kind     the kind of primitive
 * @param index    its index in the scene
 * @param id       the caller's id
 * @param depth    depth of the point found, for {@link Projection#unproject}
 * @param distance pixels between pointer and primitive, 0 on it
 * @param along    0 to 1 along a member, else 0
 */
public record Pick(PrimitiveKind kind, int index, int id, double depth, double distance, double along) {
}
