/**
 * Code families: one small class a family, which turns the parameters of a designator into a
 * {@link dev.nearlimit.codes.Code}, and the standards' tables that some of them need. Positions are information first and
 * parity last wherever the family has a systematic form of its own. A minimum distance is attached only where a theorem
 * gives it; finding one by search belongs to the algebra room.
 */
package dev.nearlimit.codes.family;
