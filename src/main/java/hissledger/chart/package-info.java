/**
 * Results as pictures: what is to be seen, laid out and lettered for a size, and encoded. Nothing is computed here but the
 * place of a point; a voltage becomes a level by {@link hissledger.physics.Decibels}.
 */
@NullMarked
package hissledger.chart;

import org.jspecify.annotations.NullMarked;
