package dev.nearlimit.journal;

import java.nio.ByteBuffer;
import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.HexFormat;

/**
 * The key of a job: SHA-256 over named fields, each with its length, so that no two different lists of fields run
 * together.
 *
 * @param hex 64 hexadecimal digits
 */
public record ContentHash(String hex) {

    public static Builder builder() {
        return new Builder();
    }

    /** Collects the fields of a key in the order in which they are added. */
    public static final class Builder {
        private final MessageDigest digest;

        private Builder() {
            try {
                digest = MessageDigest.getInstance("SHA-256");
            } catch (NoSuchAlgorithmException e) {
                throw new IllegalStateException("every Java platform has SHA-256", e);
            }
        }

        public Builder add(String field, String value) {
            return add(field, value.getBytes(StandardCharsets.UTF_8));
        }

        public Builder add(String field, long value) {
            return add(field, ByteBuffer.allocate(Long.BYTES).putLong(value).array());
        }

        public Builder add(String field, int[] values) {
            ByteBuffer bytes = ByteBuffer.allocate(values.length * Integer.BYTES);
            bytes.asIntBuffer().put(values);
            return add(field, bytes.array());
        }

        private Builder add(String field, byte[] value) {
            part(field.getBytes(StandardCharsets.UTF_8));
            part(value);
            return this;
        }

        private void part(byte[] bytes) {
            digest.update(
                    ByteBuffer.allocate(Integer.BYTES).putInt(bytes.length).array());
            digest.update(bytes);
        }

        public ContentHash build() {
            return new ContentHash(HexFormat.of().formatHex(digest.digest()));
        }
    }
}
