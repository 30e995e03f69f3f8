package broadside.table;

import broadside.trace.Status;

/**
 * Where a number was printed. Every part is needed: a number without a home is refused.
 *
 * @param publication  key of the publication in publications.csv
 * @param edition      edition of the publication
 * @param place        clause, equation or table
 * @param status       how well the number is known
 */
public record Source(String publication, String edition, String place, Status status) {

    public Source {
        requireText(publication, "publication");
        requireText(edition, "edition");
        requireText(place, "place");
    }

    /** For example "EN 1991-1-4:2005, table 4.1". */
    public String citation() {
        return publicationAndEdition() + ", " + place;
    }

    /** For example "EN 1991-1-4:2005"; an edition that begins with a letter names itself, like "ASCE/SEI 7-16". */
    public String publicationAndEdition() {
        return Character.isLetter(edition.charAt(0)) ? edition : publication + ":" + edition;
    }

    Source with(String otherPlace, Status otherStatus) {
        return new Source(publication, edition, otherPlace, otherStatus);
    }

    private static void requireText(String text, String name) {
        if (text.isBlank()) {
            throw new IllegalArgumentException("the " + name + " of a source is missing");
        }
    }
}
