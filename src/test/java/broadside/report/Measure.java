package broadside.report;

import broadside.sheet.Sheet;
import com.sun.management.ThreadMXBean;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.lang.management.ManagementFactory;
import java.util.Locale;

/** Prints the time and the memory that one PDF takes, warm; run by hand. */
final class Measure {

    private static final int WARM_UP = 400;
    private static final int ROUNDS = 200;

    public static void main(String[] args) throws IOException {
        ThreadMXBean threads = (ThreadMXBean) ManagementFactory.getThreadMXBean();
        Sheet sheet = Samples.sheet();
        long cold = System.nanoTime();
        PdfWriter writer = new PdfWriter();
        int size = write(writer, sheet);
        System.out.printf(Locale.ROOT, "first: %.0f ms, %d bytes%n", (System.nanoTime() - cold) / 1e6, size);
        for (int i = 0; i < WARM_UP; i++) {
            write(writer, sheet);
        }
        long thread = Thread.currentThread().getId();
        long bytes = threads.getThreadAllocatedBytes(thread);
        long start = System.nanoTime();
        for (int i = 0; i < ROUNDS; i++) {
            write(writer, sheet);
        }
        System.out.printf(Locale.ROOT, "warm: %.2f ms, %.2f MB each%n", (System.nanoTime() - start) / 1e6 / ROUNDS,
            (threads.getThreadAllocatedBytes(thread) - bytes) / 1e6 / ROUNDS);
    }

    private static int write(PdfWriter writer, Sheet sheet) throws IOException {
        ByteArrayOutputStream out = new ByteArrayOutputStream();
        writer.write(sheet, Paper.A4, Samples.job(), out);
        return out.size();
    }

    private Measure() { }
}
