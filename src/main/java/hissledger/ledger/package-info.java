/**
 * The itemised account of a front end: entries, totals, figures of merit, spectra. Optimising never lives here.
 */
@NullMarked
package hissledger.ledger;

import org.jspecify.annotations.NullMarked;
