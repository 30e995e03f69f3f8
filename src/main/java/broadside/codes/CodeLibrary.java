package broadside.codes;

import broadside.table.Edition;
import broadside.table.TableLibrary;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Function;

/** The wind codes on the shelf: each edition of the tables whose procedure has a class here. */
public final class CodeLibrary {

    /** One entry for each procedure: the name in edition.properties and its class. */
    private static final Map<String, Function<Edition, WindCode>> PROCEDURES = Map.of(
        "en-1991-1-4", En1991::new,
        "asce-7-16", Asce716::new,
        "asce-7-22", Asce722::new,
        "is-875-3", Is875::new,
        "as-nzs-1170-2", AsNzs1170::new,
        "open-flow", OpenFlow::new);

    private final Map<String, WindCode> codes = new LinkedHashMap<>();

    public CodeLibrary(TableLibrary tables) {
        for (Edition edition : tables.editions()) {
            Function<Edition, WindCode> procedure = PROCEDURES.get(edition.property("procedure"));
            if (procedure != null) {
                codes.put(edition.key(), procedure.apply(edition));
            }
        }
    }

    /** A code by the key of its edition or overlay, such as "en-1991-1-4/2005". */
    public Optional<WindCode> code(String key) {
        return Optional.ofNullable(codes.get(key));
    }

    /** The keys of editions that are not overlays, in order. */
    public List<String> editions() {
        return codes.entrySet().stream().filter(e -> !e.getValue().edition().isOverlay()).map(Map.Entry::getKey).toList();
    }

    /** The rule for wind on posts: that of the code, or, where it has none, that of plain fluid mechanics. */
    public Optional<MemberRule> memberRule(WindCode code) {
        return code.memberRule().or(() -> codes.values().stream().filter(c -> c.edition().property("procedure").equals("open-flow"))
            .findFirst().flatMap(WindCode::memberRule));
    }

    /** The overlays of an edition, by their keys. */
    public List<String> overlays(String key) {
        return codes.entrySet().stream()
            .filter(e -> e.getValue().edition().basis().map(b -> b.key().equals(key)).orElse(false)).map(Map.Entry::getKey).toList();
    }
}
