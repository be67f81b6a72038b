/**
 * Active devices: what a sheet says of them, the numbers resolved from it, and what bias current does to them. Circuits
 * around them never live here.
 */
@NullMarked
package hissledger.device;

import org.jspecify.annotations.NullMarked;
