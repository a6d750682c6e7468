/**
 * What goes into a decoder and what comes out: batches of 64 frames in the layout of
 * {@link dev.nearlimit.codes.batch.FrameBatch}. Buffers are made once and reused. They carry no settings.
 */
package dev.nearlimit.decoders.batch;
