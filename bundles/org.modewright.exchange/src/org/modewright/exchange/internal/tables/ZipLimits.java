package org.modewright.exchange.internal.tables;

/**
 * How much a zip may hold before it counts as an attack on memory or disk.
 *
 * @param entries most entries
 * @param expanded most bytes that all files read may have together
 * @param ratio most bytes that one stored byte may expand to
 * @param harmless a file below this many bytes may expand at any ratio
 */
record ZipLimits(int entries, long expanded, long ratio, long harmless) {

    /** Far above any real structure: tables of a hundred thousand members take some 20 MB and expand about twelvefold. */
    static final ZipLimits DEFAULT = new ZipLimits(10_000, 1L << 30, 200, 1L << 20);
}
