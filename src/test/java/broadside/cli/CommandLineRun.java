package broadside.cli;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.PrintStream;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;

/**
 * What one command line gave.
 *
 * @param status  exit status
 * @param bytes   standard output
 * @param errors  lines of standard error
 */
record CommandLineRun(int status, byte[] bytes, List<String> errors) {

    /** Runs a command line in this process; standard output is put back afterwards. */
    static CommandLineRun of(Object... words) {
        PrintStream before = System.out;
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        StringWriter errors = new StringWriter();
        String[] line = new String[words.length];
        for (int i = 0; i < words.length; i++) {
            line[i] = words[i].toString();
        }
        System.setOut(new PrintStream(out, true, StandardCharsets.UTF_8));
        try {
            int status = Commands.run(new PrintWriter(errors, true), line);
            return new CommandLineRun(status, out.toByteArray(), errors.toString().lines().toList());
        } finally {
            System.setOut(before);
        }
    }

    String out() {
        return new String(bytes, StandardCharsets.UTF_8);
    }

    /** Writes an example job into a folder, with one piece of its text replaced. */
    static Path job(Path folder, String example, String old, String other) {
        try (var in = CommandLineRun.class.getResourceAsStream("/examples/" + example)) {
            String text = new String(in.readAllBytes(), StandardCharsets.UTF_8);
            if (!text.contains(old)) {
                throw new IllegalArgumentException(example + " does not hold " + old);
            }
            return Files.writeString(folder.resolve(example), text.replace(old, other));
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    static Path job(Path folder, String example) {
        return job(folder, example, "\"broadside\"", "\"broadside\"");
    }
}
