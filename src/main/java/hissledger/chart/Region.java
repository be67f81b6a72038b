package hissledger.chart;

import hissledger.choose.Surface;

/**
 * An area of a chart that belongs to one candidate: where a surface is not negative.
 *
 * @param number which candidate of its scenario it is, from 0; chooses hatching and colour
 * @param name what is written inside it
 * @param advantage the surface
 */
record Region(int number, String name, Surface advantage) {}
