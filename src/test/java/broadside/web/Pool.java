package broadside.web;

import broadside.assess.Assessor;
import broadside.job.JobReader;
import broadside.job.PublishedChecks;
import broadside.site.SpeedConversion;
import broadside.table.TableLibrary;
import java.io.IOException;
import java.net.URI;
import java.net.URLEncoder;
import java.net.http.HttpClient;
import java.net.http.HttpRequest;
import java.net.http.HttpResponse;
import java.nio.charset.StandardCharsets;
import java.time.Clock;
import java.time.Duration;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Collectors;

/** One running server for all tests of pages, and the plainest way to talk to it. */
final class Pool {

    private static final TableLibrary TABLES = TableLibrary.shipped();
    static final Assessor ASSESSOR = new Assessor(TABLES);
    private static final SpeedConversion CONVERSION = new SpeedConversion(TABLES.edition("gust-factors/1").orElseThrow().curve("durst"));
    static final JobReader READER = new JobReader(ASSESSOR.codes(), CONVERSION);
    private static final WebServer SERVER = new WebServer(ASSESSOR, READER, new PublishedChecks(ASSESSOR, READER, CONVERSION), TABLES,
        new ShippedDocuments(Clock.systemUTC())).start("127.0.0.1", 0);
    private static final HttpClient CLIENT = HttpClient.newBuilder().connectTimeout(Duration.ofSeconds(5)).build();

    static final String SIGN = "{\"broadside\":1,\"title\":\"Test sign\",\"basis\":{\"code\":\"en-1991-1-4\",\"edition\":\"2005\"},"
        + "\"site\":{\"basic-speed\":\"26 m/s\",\"averaging\":\"10 min mean\",\"terrain\":\"II\"},"
        + "\"items\":[{\"mark\":\"S1\",\"kind\":\"post-sign\",\"boards\":[{\"width\":\"3 m\",\"height\":\"2 m\",\"clearance\":\"2.5 m\"}],"
        + "\"posts\":{\"count\":2,\"spacing\":\"2 m\"}}]}";

    static int port() {
        return SERVER.port();
    }

    static String base() {
        return "http://127.0.0.1:" + SERVER.port();
    }

    static HttpResponse<String> get(String path) {
        return send(HttpRequest.newBuilder(URI.create(base() + path)));
    }

    static HttpResponse<byte[]> bytes(String path) {
        return send(HttpRequest.newBuilder(URI.create(base() + path)), HttpResponse.BodyHandlers.ofByteArray());
    }

    static HttpResponse<String> post(String path, Map<String, String> form, String... headers) {
        HttpRequest.Builder request = HttpRequest.newBuilder(URI.create(base() + path))
            .header("Content-Type", "application/x-www-form-urlencoded").POST(HttpRequest.BodyPublishers.ofString(encoded(form)));
        for (int i = 0; i < headers.length; i += 2) {
            request.header(headers[i], headers[i + 1]);
        }
        HttpResponse<String> answer = send(request);
        String on = answer.headers().firstValue("Location").orElse("");
        return on.contains("/fill?d=") ? get(on.substring(on.indexOf("/fill?d="))) : answer;
    }

    static HttpResponse<String> send(HttpRequest.Builder request) {
        return send(request, HttpResponse.BodyHandlers.ofString(StandardCharsets.UTF_8));
    }

    private static <T> HttpResponse<T> send(HttpRequest.Builder request, HttpResponse.BodyHandler<T> as) {
        try {
            return CLIENT.send(request.timeout(Duration.ofSeconds(30)).build(), as);
        } catch (IOException e) {
            throw new java.io.UncheckedIOException(e);
        } catch (InterruptedException e) {
            throw new IllegalStateException(e);
        }
    }

    static String encoded(Map<String, String> form) {
        return form.entrySet().stream().map(e -> URLEncoder.encode(e.getKey(), StandardCharsets.UTF_8) + "="
            + URLEncoder.encode(e.getValue(), StandardCharsets.UTF_8)).collect(Collectors.joining("&"));
    }

    /** The fields of the form on a page with what stands in them, as a browser would send them. */
    static Map<String, String> fields(String html) {
        Map<String, String> fields = new LinkedHashMap<>();
        String form = html.substring(html.indexOf("data-sheet"));
        Matcher inputs = Pattern.compile("<input ([^>]*)>").matcher(form);
        while (inputs.find()) {
            String input = inputs.group(1);
            boolean left = input.contains("type=\"radio\"") && !input.contains("checked");
            String name = attribute(input, "name");
            if (!left && !name.isEmpty()) {
                fields.put(name, attribute(input, "value"));
            }
        }
        Matcher selects = Pattern.compile("(?s)<select ([^>]*)>(.*?)</select>").matcher(form);
        while (selects.find()) {
            Matcher chosen = Pattern.compile("<option ([^>]*)selected").matcher(selects.group(2));
            fields.put(attribute(selects.group(1), "name"), chosen.find() ? attribute(chosen.group(1), "value") : "");
        }
        return fields;
    }

    private static String attribute(String tag, String name) {
        Matcher found = Pattern.compile("(?:^|\\s)" + name + "=\"([^\"]*)\"").matcher(tag);
        return found.find() ? plain(found.group(1)) : "";
    }

    /** The text that a browser would show for escaped text. */
    static String plain(String html) {
        return html.replace("&lt;", "<").replace("&gt;", ">").replace("&quot;", "\"").replace("&#39;", "'").replace("&#0;", "\u0000").replace("&amp;", "&");
    }

    private Pool() { }
}
