/**
 * How results leave the tool: aligned tables, CSV, JSON, files that are whole or absent, standard streams that notice
 * when nobody reads them. What a result contains is decided by its command. Nothing here knows a code or a decoder.
 */
package dev.nearlimit.cli.output;
