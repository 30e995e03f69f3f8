package broadside.cli;

import broadside.assess.BadJob;
import broadside.assess.Job;
import broadside.job.JobReader;
import broadside.job.JobText;
import broadside.report.PdfReader;
import broadside.report.ReportException;
import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.util.Optional;
import java.util.concurrent.CompletableFuture;
import java.util.concurrent.CompletionException;
import tools.jackson.databind.JsonNode;

/** Opens a job file, or the job inside a Broadside PDF. */
final class JobFiles {

    /** A job with the JSON that it was read from. */
    record Opened(Job job, JsonNode json) { }

    /** Begins to read a file while the tables are read: each takes a tenth of a second in a new process. */
    static CompletableFuture<JsonNode> begin(Path file) {
        return CompletableFuture.supplyAsync(() -> {
            byte[] bytes = bytes(file);
            return JobText.read(isPdf(bytes) ? inside(file, bytes) : bytes);
        });
    }

    /** Reads the job in a file; every problem becomes one line that begins with the file. */
    static Opened open(Path file, CompletableFuture<JsonNode> begun, JobReader reader) {
        try {
            JsonNode json = begun.join();
            return new Opened(reader.read(json).orThrow(), json);
        } catch (CompletionException e) {
            if (e.getCause() instanceof Refused refused) {
                throw refused;
            }
            throw e.getCause() instanceof BadJob bad ? new Refused(bad.problems().stream().map(p -> file + ": " + p.line()).toList()) : e;
        } catch (BadJob e) {
            throw new Refused(e.problems().stream().map(p -> file + ": " + p.line()).toList());
        }
    }

    private static boolean isPdf(byte[] bytes) {
        return bytes.length > 4 && bytes[0] == '%' && bytes[1] == 'P' && bytes[2] == 'D' && bytes[3] == 'F';
    }

    private static byte[] inside(Path file, byte[] pdf) {
        try {
            Optional<byte[]> job = PdfReader.job(pdf);
            return job.orElseThrow(() -> new Refused(file + ": this PDF holds no Broadside job; give a job file or a PDF that Broadside wrote"));
        } catch (ReportException e) {
            throw new Refused(file + ": " + e.getMessage());
        }
    }

    private static byte[] bytes(Path file) {
        try (InputStream in = Files.newInputStream(file)) {
            byte[] bytes = in.readNBytes(PdfReader.MOST_BYTES + 1);
            if (bytes.length > PdfReader.MOST_BYTES) {
                throw new Refused(file + ": the file has more than " + PdfReader.MOST_BYTES + " bytes");
            }
            return bytes;
        } catch (NoSuchFileException e) {
            throw new Refused(file + ": there is no such file");
        } catch (IOException e) {
            throw new Refused(file + ": the file cannot be read" + (Files.isDirectory(file) ? ", it is a folder" : ""));
        }
    }

    private JobFiles() { }
}
