package dev.nearlimit.shortlist;

import dev.nearlimit.codes.catalogue.Catalogue;
import dev.nearlimit.decoders.catalogue.DecoderDesignator;
import dev.nearlimit.limits.Modulation;
import dev.nearlimit.shortlist.requirement.Candidate;
import dev.nearlimit.shortlist.requirement.Link;
import dev.nearlimit.shortlist.requirement.Loss;
import dev.nearlimit.shortlist.requirement.Payload;
import dev.nearlimit.shortlist.requirement.Requirement;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.OptionalDouble;

/** Requirements for tests: a link with a given Eb/N0, wide enough for everything unless a test narrows it. */
final class Requirements {
    private Requirements() {}

    static Requirement of(double availableEbn0Db, Payload payload, Candidate... candidates) {
        return of(availableEbn0Db, 1e6, OptionalDouble.empty(), payload, candidates);
    }

    static Requirement of(
            double availableEbn0Db,
            double bandwidthHz,
            OptionalDouble operationsPerBit,
            Payload payload,
            Candidate... candidates) {
        Link link = new Link(
                bandwidthHz,
                0.25,
                1000,
                OptionalDouble.empty(),
                OptionalDouble.of(availableEbn0Db + 0.5),
                List.of(new Loss("cable", 0.5)),
                List.of(Modulation.BPSK, Modulation.QPSK));
        return new Requirement(
                "test", "", link, payload, OptionalDouble.empty(), operationsPerBit, Arrays.asList(candidates));
    }

    static Candidate candidate(String code, String... decoders) {
        List<dev.nearlimit.decoders.catalogue.DecoderChoice> choices = new ArrayList<>();
        for (String decoder : decoders) {
            choices.add(DecoderDesignator.parse(decoder));
        }
        return new Candidate(Catalogue.standard().build(code), code.split(":")[0], choices);
    }
}
