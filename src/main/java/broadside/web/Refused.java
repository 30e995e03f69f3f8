package broadside.web;

/** A request that gets a plain page in place of what it asked for. */
final class Refused extends RuntimeException {

    private final int status;
    private final String title;

    Refused(int status, String title, String sentence) {
        super(sentence);
        this.status = status;
        this.title = title;
    }

    int status() {
        return status;
    }

    String title() {
        return title;
    }

    static Refused notFound() {
        return new Refused(404, "There is no such page", "The address leads nowhere here. Check it, or begin at the start page.");
    }

    static Refused badLink(String why) {
        return new Refused(400, "This link does not hold a job", why + " Copy the whole link, or open the job file again from the start page.");
    }

    static Refused tooLarge() {
        return new Refused(413, "That is too large", "At most " + (Sent.LARGEST >> 10) + " KB can be sent to this page. A job file or PDF of this tool is "
            + "far smaller; check that it is the right file.");
    }
}
