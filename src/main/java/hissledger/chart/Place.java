package hissledger.chart;

import java.util.OptionalDouble;

/**
 * A marked place on the horizontal axis.
 *
 * @param label what is there
 * @param x where
 * @param y the height of the point that is ringed; empty for none
 */
record Place(String label, double x, OptionalDouble y) {}
