package broadside.report;

/**
 * The job file that travels inside the PDF, so that the PDF opens again as a job.
 *
 * @param fileName    name of the file inside the PDF, such as {@code job.json}
 * @param description what the file is, in a few words
 * @param bytes       the file as JSON text in UTF-8, at most {@value #MOST_BYTES} bytes
 */
public record Attachment(String fileName, String description, byte[] bytes) {

    /** The largest job file that a PDF carries. */
    public static final int MOST_BYTES = 2_000_000;

    public Attachment {
        if (fileName.isBlank()) {
            throw new IllegalArgumentException("the job file in a PDF needs a name, such as job.json");
        }
        if (bytes.length > MOST_BYTES) {
            throw new IllegalArgumentException("the job file has " + bytes.length + " bytes; a PDF carries at most "
                + MOST_BYTES);
        }
        bytes = bytes.clone();
    }

    @Override
    public byte[] bytes() {
        return bytes.clone();
    }
}
