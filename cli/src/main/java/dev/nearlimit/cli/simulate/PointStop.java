package dev.nearlimit.cli.simulate;

/** What ended a point. */
enum PointStop {
    /** The frame errors that suffice were seen. */
    FRAME_ERRORS("frameErrors"),
    /** The frames allowed were used up. */
    FRAMES("frames"),
    /** Time was up; at which frame no other run will say. */
    TIME_LIMIT("timeLimit"),
    /** The user or the system ended the run. */
    INTERRUPT("interrupt");

    private final String field;

    PointStop(String field) {
        this.field = field;
    }

    /** As in JSON and CSV. */
    @Override
    public String toString() {
        return field;
    }
}
