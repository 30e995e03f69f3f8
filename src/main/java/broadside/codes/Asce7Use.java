package broadside.codes;

/** What a pressure of ASCE 7 is worked out for. */
enum Asce7Use {

    SOLID("solid signs", "q_h", "K_h", "h", "at the top", "solid signs and walls"),
    OPEN("open signs", "q_z", "K_z", "z", "at the middle", "open signs"),
    CLADDING_TOP("components and cladding", "q_h", "K_h", "h", "at the top of the building", "components and cladding"),
    CLADDING("components and cladding", "q_z", "K_z", "z", "at the top of the panel", "components and cladding");

    private final String structure;
    private final String pressure;
    private final String exposure;
    private final String height;
    private final String where;
    private final String words;

    Asce7Use(String structure, String pressure, String exposure, String height, String where, String words) {
        this.structure = structure;
        this.pressure = pressure;
        this.exposure = exposure;
        this.height = height;
        this.where = where;
        this.words = words;
    }

    /** Its row in the table of K_d. */
    String structure() {
        return structure;
    }

    /** Symbol of the velocity pressure. */
    String pressure() {
        return pressure;
    }

    /** Symbol of the exposure coefficient. */
    String exposure() {
        return exposure;
    }

    /** Symbol of the height above the ground. */
    String height() {
        return height;
    }

    /** Where that height is, in words. */
    String where() {
        return where;
    }

    String words() {
        return words;
    }

    boolean cladding() {
        return this == CLADDING || this == CLADDING_TOP;
    }
}
