package broadside.site;

import java.util.Arrays;
import java.util.List;
import java.util.Optional;

/** Averaging time of a wind speed, in seconds; a speed without it says nothing. */
public enum Averaging {

    GUST_0_2_S("0.2 s gust", 0.2),
    GUST_1_S("1 s gust", 1),
    GUST_3_S("3 s gust", 3),
    GUST_10_S("10 s gust", 10),
    GUST_30_S("30 s gust", 30),
    MEAN_1_MIN("1 min mean", 60),
    MEAN_10_MIN("10 min mean", 600),
    MEAN_1_H("1 h mean", 3600);

    private final String words;
    private final double seconds;

    Averaging(String words, double seconds) {
        this.words = words;
        this.seconds = seconds;
    }

    public String words() {
        return words;
    }

    public double seconds() {
        return seconds;
    }

    public static Optional<Averaging> of(String words) {
        return Arrays.stream(values()).filter(a -> a.words.equals(words.strip())).findFirst();
    }

    public static List<String> allWords() {
        return Arrays.stream(values()).map(Averaging::words).toList();
    }
}
