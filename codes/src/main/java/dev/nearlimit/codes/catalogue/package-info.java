/**
 * Finding codes by designator: the families in the order in which they are listed, the modifications that a suffix
 * names, and the user's own matrix files. Adding a family takes one class in {@code dev.nearlimit.codes.family} and one
 * line in {@link dev.nearlimit.codes.catalogue.Catalogue#standard()}. How a code is made belongs to its family, how a
 * file is read to {@code dev.nearlimit.codes.matrix}.
 */
package dev.nearlimit.codes.catalogue;
