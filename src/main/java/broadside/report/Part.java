package broadside.report;

/** A part of the document that has been measured and waits for its place. */
interface Part {

    /** Returns the height in points that the beginning of the part needs to stay on one page. */
    double first();

    void place(Flow flow);

    /** Two parts of which the first does not stand at the foot of a page without the beginning of the second. */
    record Kept(Part head, Part follower) implements Part {

        @Override
        public double first() {
            return head.first() + follower.first();
        }

        @Override
        public void place(Flow flow) {
            flow.keep(first());
            head.place(flow);
            follower.place(flow);
        }
    }
}
