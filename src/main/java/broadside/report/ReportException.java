package broadside.report;

/** A document that cannot be written or read; the message is one plain line for the reader. */
public final class ReportException extends RuntimeException {

    public ReportException(String message) {
        super(message);
    }

    public ReportException(String message, Throwable cause) {
        super(message, cause);
    }
}
