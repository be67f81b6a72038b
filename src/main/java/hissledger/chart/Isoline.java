package hissledger.chart;

import hissledger.choose.Surface;

/**
 * The lines of one value on a surface.
 *
 * @param surface the surface
 * @param level the value
 * @param label what is written on the lines
 */
record Isoline(Surface surface, double level, String label) {}
