/**
 * The laws a noise engineer looks up: constants, decibels, thermal, shot, flicker and excess noise, weightings, bands
 * and the integration of a density over a band. SI units throughout. Circuits never live here.
 */
@NullMarked
package hissledger.physics;

import org.jspecify.annotations.NullMarked;
