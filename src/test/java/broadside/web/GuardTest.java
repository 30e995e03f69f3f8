package broadside.web;

import static org.assertj.core.api.Assertions.assertThat;

import broadside.job.JobText;
import java.io.IOException;
import java.net.Socket;
import java.net.URI;
import java.net.http.HttpRequest;
import java.net.http.HttpResponse;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

class GuardTest {

    static List<String> addresses() {
        String token = Token.of(JobText.read(Pool.SIGN.getBytes(StandardCharsets.UTF_8)));
        return List.of("/", "/fill?kind=post-sign", "/fill?kind=hoarding&units=us", "/fill?j=" + token, "/answer?j=" + token, "/summary.pdf?j=" + token,
            "/job.json?j=" + token, "/drawing.svg?item=0&j=" + token, "/drawing.svg?picture=0&j=" + token, "/tables", "/tables/en-1991-1-4/2005", "/checks",
            "/checks/SIGN", "/about", "/health", "/schema.json", "/sheet.css", "/sheet.js", "/mark.svg", "/nowhere", "/fill", "/answer", "/answer?j=broken",
            "/tables/no/thing", "/open", "/drawing", "/checks/none");
    }

    @ParameterizedTest
    @MethodSource("addresses")
    void every_answer_has_the_headers(String address) {
        HttpResponse<String> answer = Pool.get(address);
        Guard.HEADERS.forEach((name, value) -> assertThat(answer.headers().allValues(name)).as(name).containsExactly(value));
        assertThat(answer.headers().firstValue("Server")).isEmpty();
        assertThat(answer.headers().firstValue("X-Powered-By")).isEmpty();
        String type = answer.headers().firstValue("Content-Type").orElseThrow();
        assertThat(type.contains("charset=utf-8") || type.equals("application/pdf")).as(type).isTrue();
        assertThat(answer.headers().firstValue("Cache-Control")).isPresent();
        assertThat(answer.headers().firstValue("Set-Cookie")).isEmpty();
        assertThat(answer.statusCode()).isNotEqualTo(500);
    }

    @Test
    void policy_allows_nothing_inline_and_pages_hold_nothing_inline() {
        assertThat(Guard.HEADERS.get("Content-Security-Policy")).contains("default-src 'self'").doesNotContain("unsafe");
        for (String address : addresses()) {
            HttpResponse<String> answer = Pool.get(address);
            if (answer.headers().firstValue("Content-Type").orElse("").startsWith("text/html")) {
                assertThat(answer.body()).doesNotContain(" style=").doesNotContain("<style").doesNotContainPattern("<script(?! src)").doesNotContainPattern("\\son[a-z]+=")
                    .doesNotContain("http://").doesNotContain("https://");
            }
        }
    }

    /** A card works when it is saved, so that its style stands in it; that style alone is allowed, by its digest. */
    @Test
    void the_card_holds_its_own_style_and_nothing_else_inline() {
        HttpResponse<String> answer = Pool.get("/card?j=" + Token.of(JobText.read(Pool.SIGN.getBytes(StandardCharsets.UTF_8))));
        Guard.HEADERS.forEach((name, value) -> assertThat(answer.headers().firstValue(name).orElseThrow()).as(name).startsWith(value));
        assertThat(answer.headers().firstValue("Content-Security-Policy").orElseThrow()).contains("style-src 'sha256-").doesNotContain("unsafe");
        assertThat(answer.body().split("<style>")).hasSize(2);
        assertThat(answer.body()).doesNotContain(" style=").doesNotContain("<script").doesNotContainPattern("\\son[a-z]+=").doesNotContain("http://").doesNotContain("https://");
    }

    @Test
    void pages_of_jobs_are_not_stored() {
        String token = Token.of(JobText.read(Pool.SIGN.getBytes(StandardCharsets.UTF_8)));
        for (String address : List.of("/answer?j=" + token, "/fill?j=" + token, "/job.json?j=" + token, "/summary.pdf?j=" + token)) {
            assertThat(Pool.get(address).headers().firstValue("Cache-Control")).contains("no-store");
        }
    }

    @Test
    void unknown_pages_and_wrong_methods_have_plain_pages() {
        assertThat(Pool.get("/nowhere").statusCode()).isEqualTo(404);
        assertThat(Pool.get("/../pom.xml").statusCode()).isGreaterThanOrEqualTo(400);
        assertThat(Pool.get("/templates/form.html").statusCode()).isEqualTo(404);
        assertThat(Pool.get("/open").statusCode()).isEqualTo(405);
        assertThat(Pool.post("/tables", Map.of()).statusCode()).isEqualTo(405);
        for (String method : List.of("PUT", "DELETE", "OPTIONS", "PATCH", "TRACE")) {
            HttpResponse<String> answer = Pool.send(HttpRequest.newBuilder(URI.create(Pool.base() + "/")).method(method,
                HttpRequest.BodyPublishers.noBody()));
            assertThat(answer.statusCode()).as(method).isEqualTo(405);
            assertThat(answer.headers().firstValue("Content-Security-Policy")).as(method).isPresent();
        }
        assertThat(Pool.send(HttpRequest.newBuilder(URI.create(Pool.base() + "/")).method("HEAD", HttpRequest.BodyPublishers.noBody())).statusCode()).isEqualTo(200);
    }

    @Test
    void forms_from_other_pages_are_refused() {
        Map<String, String> form = Map.of("do", "redraw", "items[0].kind", "post-sign");
        assertThat(Pool.post("/fill", form, "Sec-Fetch-Site", "cross-site").statusCode()).isEqualTo(403);
        assertThat(Pool.post("/fill", form, "Sec-Fetch-Site", "same-site").statusCode()).isEqualTo(403);
        assertThat(Pool.post("/fill", form, "Origin", "https://elsewhere.example").statusCode()).isEqualTo(403);
        assertThat(Pool.post("/fill", form, "Origin", "null").statusCode()).isEqualTo(403);
        assertThat(Pool.post("/open", form, "Sec-Fetch-Site", "cross-site").statusCode()).isEqualTo(403);
        assertThat(Pool.post("/drawing", form, "Sec-Fetch-Site", "cross-site").statusCode()).isEqualTo(403);
        assertThat(Pool.post("/fill", form, "Sec-Fetch-Site", "same-origin").statusCode()).isEqualTo(200);
        assertThat(Pool.post("/fill", form, "Origin", Pool.base()).statusCode()).isEqualTo(200);
        assertThat(Pool.post("/fill", form).statusCode()).isEqualTo(200);
    }

    @Test
    void a_body_of_ten_megabytes_is_refused() {
        HttpResponse<String> known = Pool.send(HttpRequest.newBuilder(URI.create(Pool.base() + "/fill"))
            .header("Content-Type", "application/x-www-form-urlencoded").POST(HttpRequest.BodyPublishers.ofByteArray(new byte[10 << 20])));
        assertThat(known.statusCode()).isEqualTo(413);
        HttpResponse<String> chunked = Pool.send(HttpRequest.newBuilder(URI.create(Pool.base() + "/fill"))
            .header("Content-Type", "application/x-www-form-urlencoded")
            .POST(HttpRequest.BodyPublishers.ofInputStream(() -> new java.io.ByteArrayInputStream(new byte[3 << 20]))));
        assertThat(chunked.statusCode()).isEqualTo(413);
        assertThat(known.body()).contains("too large");
    }

    @Test
    void an_upload_that_is_too_large_is_refused() {
        String edge = "edge";
        String head = "--" + edge + "\r\nContent-Disposition: form-data; name=\"file\"; filename=\"a.json\"\r\n\r\n";
        for (int size : new int[] {(1 << 20) - 50, 3 << 20}) {
            byte[] body = (head + " ".repeat(size) + "\r\n--" + edge + "--\r\n").getBytes(StandardCharsets.US_ASCII);
            for (HttpRequest.BodyPublisher sent : List.of(HttpRequest.BodyPublishers.ofByteArray(body),
                HttpRequest.BodyPublishers.ofInputStream(() -> new java.io.ByteArrayInputStream(body)))) {
                HttpResponse<String> answer = Pool.send(HttpRequest.newBuilder(URI.create(Pool.base() + "/open"))
                    .header("Content-Type", "multipart/form-data; boundary=" + edge).POST(sent));
                assertThat(answer.statusCode()).as(size + " bytes").isEqualTo(413);
            }
        }
    }

    @Test
    void forms_with_too_many_or_double_fields_are_refused() {
        String many = java.util.stream.IntStream.range(0, 5000).mapToObj(i -> "a" + i + "=1").collect(java.util.stream.Collectors.joining("&"));
        for (String body : List.of(many, "a=1&a=2", "a=%zz", "a".repeat(300) + "=1", "item=x", "item=7", "kept=broken")) {
            HttpResponse<String> answer = Pool.send(HttpRequest.newBuilder(URI.create(Pool.base() + "/fill"))
                .header("Content-Type", "application/x-www-form-urlencoded").POST(HttpRequest.BodyPublishers.ofString(body)));
            assertThat(answer.statusCode()).as(body.substring(0, Math.min(20, body.length()))).isEqualTo(400);
        }
        assertThat(Pool.send(HttpRequest.newBuilder(URI.create(Pool.base() + "/fill")).header("Content-Type", "text/plain")
            .POST(HttpRequest.BodyPublishers.ofString("a=1"))).statusCode()).isEqualTo(415);
    }

    @ParameterizedTest
    @ValueSource(strings = {"GARBAGE\r\n\r\n", "GET / HTTP/1.1\r\nBad Header\r\n\r\n", "GET /%zz HTTP/1.1\r\nHost: a\r\n\r\n", "GET / HTTP/1.1\r\n\r\n"})
    void requests_that_cannot_be_read_have_the_headers_too(String request) throws IOException {
        String answer = raw(request);
        assertThat(answer).startsWith("HTTP/1.1 400").contains("Content-Security-Policy").contains("nosniff").doesNotContain("Jetty").doesNotContain("Exception");
    }

    @Test
    void a_sender_that_drips_is_cut_off() throws Exception {
        try (Socket socket = new Socket("127.0.0.1", Pool.port())) {
            socket.setSoTimeout(8000);
            socket.getOutputStream().write(("POST /fill HTTP/1.1\r\nHost: a\r\nContent-Type: application/x-www-form-urlencoded\r\nContent-Length: 100000\r\n\r\n")
                .getBytes(StandardCharsets.US_ASCII));
            int sent = 0;
            while (sent < 40 && socket.getInputStream().available() == 0) {
                socket.getOutputStream().write('a');
                Thread.sleep(100);
                sent++;
            }
            assertThat(sent).as("tenths of a second until the answer").isLessThan(40);
            byte[] head = new byte[12];
            assertThat(socket.getInputStream().readNBytes(head, 0, 12)).isEqualTo(12);
            assertThat(new String(head, StandardCharsets.US_ASCII)).isEqualTo("HTTP/1.1 408");
        }
    }

    @Test
    void a_head_line_that_is_too_long_is_refused() throws IOException {
        assertThat(raw("GET /answer?j=" + "a".repeat(70_000) + " HTTP/1.1\r\nHost: a\r\n\r\n")).containsPattern("HTTP/1.1 4(14|31)").contains("nosniff");
    }

    private static String raw(String request) throws IOException {
        try (Socket socket = new Socket("127.0.0.1", Pool.port())) {
            socket.setSoTimeout(5000);
            socket.getOutputStream().write(request.getBytes(StandardCharsets.ISO_8859_1));
            socket.getOutputStream().flush();
            socket.shutdownOutput();
            return new String(socket.getInputStream().readAllBytes(), StandardCharsets.ISO_8859_1);
        }
    }
}
