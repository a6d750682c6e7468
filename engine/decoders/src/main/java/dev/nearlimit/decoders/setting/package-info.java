/**
 * Reading the settings of a designator, {@code iterations=20,scale=6/8}: keys, values and the messages that a user gets
 * for wrong ones. What a setting means is known to the decoder or quantiser that takes it. Nothing here knows a decoder.
 */
package dev.nearlimit.decoders.setting;
