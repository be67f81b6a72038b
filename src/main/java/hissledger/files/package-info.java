/**
 * Files: quantities with units, JSON in and out with positions, scenarios, device sheets and their catalogue, and writing that
 * leaves nothing half-done. Physics never lives here.
 */
@NullMarked
package hissledger.files;

import org.jspecify.annotations.NullMarked;
