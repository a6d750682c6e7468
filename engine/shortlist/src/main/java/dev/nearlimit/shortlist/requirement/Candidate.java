package dev.nearlimit.shortlist.requirement;

import dev.nearlimit.codes.Code;
import dev.nearlimit.decoders.catalogue.DecoderChoice;
import java.util.List;

/**
 * A code to be considered, and the decoders to consider it with.
 *
 * @param code the code, before it is fitted to the payload
 * @param family family name, or {@code matrix} for the user's own
 * @param decoders decoders with their quantisers; each fits the code
 */
public record Candidate(Code code, String family, List<DecoderChoice> decoders) {
    public Candidate {
        decoders = List.copyOf(decoders);
    }
}
