/**
 * Chains of noisy two-ports: impedances, the walk along a chain, series and shunt elements, ideal step-up, common lead,
 * follower, parallel devices, pairs, and the figures of a two-port seen as a whole. Transistors and files never live here.
 *
 * <p>Sources: H. Rothe and W. Dahlke, <cite>Theory of noisy fourpoles</cite>, Proc. IRE 44 (1956) 811; IRE Subcommittee
 * 7.9, <cite>Representation of noise in linear twoports</cite>, Proc. IRE 48 (1960) 69; H. Hillbrand and P. Russer,
 * <cite>An efficient method for computer aided noise analysis of linear amplifier networks</cite>, IEEE Trans. CAS 23
 * (1976) 235.
 */
@NullMarked
package hissledger.twoport;

import org.jspecify.annotations.NullMarked;
