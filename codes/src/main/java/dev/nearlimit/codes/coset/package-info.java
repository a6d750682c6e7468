/**
 * Cosets of a code: the least-weight pattern of every syndrome, and how many cosets have leaders of which weight.
 * Decoders and exact error rates of hard decisions stand on them. Only codes with few parity bits have tables that fit.
 */
package dev.nearlimit.codes.coset;
