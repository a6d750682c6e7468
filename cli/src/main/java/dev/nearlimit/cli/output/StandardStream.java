package dev.nearlimit.cli.output;

import java.io.FileDescriptor;
import java.io.FileOutputStream;
import java.io.IOException;
import java.io.OutputStream;
import java.io.OutputStreamWriter;
import java.io.PrintWriter;
import java.nio.charset.StandardCharsets;
import java.util.Locale;
import java.util.Optional;

/**
 * A standard stream in UTF-8 that remembers why writing failed. A reader that has gone ({@code | head}) is no failure:
 * what it did not want is dropped.
 */
public final class StandardStream implements AutoCloseable {
    private final Sink sink;
    private final PrintWriter writer;

    private StandardStream(FileDescriptor descriptor) {
        sink = new Sink(new FileOutputStream(descriptor));
        writer = new PrintWriter(new OutputStreamWriter(sink, StandardCharsets.UTF_8));
    }

    public static StandardStream output() {
        return new StandardStream(FileDescriptor.out);
    }

    /** Standard error: under the launcher's number for it where it keeps that of the JVM apart. */
    public static StandardStream error() {
        return new StandardStream(
                InheritedDescriptor.named("nearlimit.error-descriptor").orElse(FileDescriptor.err));
    }

    public PrintWriter writer() {
        return writer;
    }

    /** Why something could not be written, unless the reader had simply gone. */
    public Optional<String> failure() {
        writer.flush();
        return Optional.ofNullable(sink.failure);
    }

    @Override
    public void close() {
        writer.flush();
    }

    private static final class Sink extends OutputStream {
        private final FileOutputStream target;
        private boolean broken;
        private String failure;

        Sink(FileOutputStream target) {
            this.target = target;
        }

        @Override
        public void write(int b) {
            write(new byte[] {(byte) b}, 0, 1);
        }

        @Override
        public void write(byte[] bytes, int from, int length) {
            if (broken) {
                return;
            }
            try {
                target.write(bytes, from, length);
            } catch (IOException e) {
                broken = true;
                String reason = String.valueOf(e.getMessage());
                if (!reason.toLowerCase(Locale.ROOT).contains("broken pipe")) {
                    failure = reason;
                }
            }
        }
    }
}
