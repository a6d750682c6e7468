/**
 * What counts say about the rates behind them: confidence intervals that are exact for the stopping rule, or say what
 * they approximate. Nothing here draws a random number or knows what was simulated.
 */
package dev.nearlimit.simulation.statistics;
