package broadside.cli;

import broadside.assess.Assessor;
import broadside.job.JobReader;
import broadside.job.PublishedChecks;
import broadside.site.SpeedConversion;
import broadside.table.TableFiles;
import broadside.table.TableFormat;
import broadside.table.TableLibrary;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.CompletableFuture;

/**
 * The parts of the tool, put together once: tables, codes, assessor and readers.
 *
 * @param tables     all tables, read and checked
 * @param assessor   job in, assessment out
 * @param reader     of job files
 * @param checks     published checks
 */
public record Tool(TableLibrary tables, Assessor assessor, JobReader reader, PublishedChecks checks) {

    /** Begins to read the tables that ship with the tool, while the command line is taken apart. */
    static CompletableFuture<TableLibrary> begin() {
        return CompletableFuture.supplyAsync(TableLibrary::shipped);
    }

    /** Puts the tool together from the tables that ship with it, and from those in a folder of the user's own. */
    static Tool of(Optional<Path> ownTables, CompletableFuture<TableLibrary> shipped) {
        return ownTables.isPresent() ? of(ownTables) : of(TableFormat.joined(shipped));
    }

    /**
     * Puts the tool together.
     *
     * @param ownTables  a folder with more editions and overlays, such as a firm's own values
     * @throws TableFormat when a table is not as it must be
     */
    public static Tool of(Optional<Path> ownTables) {
        return of(ownTables.map(folder -> TableLibrary.of(TableFiles.shipped("code-tables"), own(folder))).orElseGet(TableLibrary::shipped));
    }

    private static Tool of(TableLibrary tables) {
        Assessor assessor = new Assessor(tables);
        SpeedConversion conversion = new SpeedConversion(tables.edition("gust-factors/1").orElseThrow().curve("durst"));
        JobReader reader = new JobReader(assessor.codes(), conversion);
        return new Tool(tables, assessor, reader, new PublishedChecks(assessor, reader, conversion));
    }

    private static Map<String, byte[]> own(Path folder) {
        if (!Files.isDirectory(folder)) {
            throw new Refused(folder + ": " + (Files.exists(folder) ? "is not a folder" : "there is no such folder"));
        }
        try {
            return TableFiles.below(folder);
        } catch (IOException e) {
            throw new Refused(folder + ": this folder cannot be read");
        }
    }
}
