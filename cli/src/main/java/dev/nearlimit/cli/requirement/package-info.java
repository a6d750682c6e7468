/**
 * Reads a requirement from its YAML file. Every field is known by name, every mistake is reported with the line and
 * column where it stands, and nothing is guessed. What a requirement means belongs to the shortlist room.
 */
package dev.nearlimit.cli.requirement;
