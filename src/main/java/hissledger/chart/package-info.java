/**
 * Results as pictures. Nothing is computed here but the place of a point.
 */
@NullMarked
package hissledger.chart;

import org.jspecify.annotations.NullMarked;
