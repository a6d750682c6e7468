/**
 * The decoders that users can name, and how a designator becomes settings. A new decoder is one class that implements
 * {@link dev.nearlimit.decoders.DecoderFamily} and one line in {@link dev.nearlimit.decoders.catalogue.DecoderCatalogue}.
 * No decoding happens here.
 */
package dev.nearlimit.decoders.catalogue;
