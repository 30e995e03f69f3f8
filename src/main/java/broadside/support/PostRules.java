package broadside.support;

import broadside.support.Section.Material;
import broadside.table.Edition;
import broadside.table.Rows;
import java.util.EnumMap;
import java.util.LinkedHashMap;
import java.util.Map;

/** The rule by which posts of a material are checked on a route. Rules are made once and kept. */
public final class PostRules {

    /** Key of the tables. */
    public static final String EDITION = "post-rules/1";

    /** The duration of the wind that is safe where nothing is said. */
    public static final String SHORT = "short";

    private final PostRule steelEn;
    private final PostRule steelAllowable;
    private final PostRule steelFactored;
    private final PostRule timberUs;
    private final Map<AluminiumPosts.Way, PostRule> aluminium = new EnumMap<>(AluminiumPosts.Way.class);
    private final Map<String, PostRule> timber = new LinkedHashMap<>();

    public PostRules(Edition edition) {
        this.steelEn = new En1993Posts(edition);
        this.steelAllowable = new Aisc360Posts(edition, false);
        this.steelFactored = new Aisc360Posts(edition, true);
        this.timberUs = new NdsPosts(edition);
        for (AluminiumPosts.Way way : AluminiumPosts.Way.values()) {
            aluminium.put(way, new AluminiumPosts(edition, way));
        }
        Rows durations = edition.rows("timber-duration");
        durations.keys().forEach(duration -> timber.put(duration, new En1995Posts(edition, durations, duration)));
    }

    /** The rule with wind as short-term load. */
    public PostRule of(String route, Material material) {
        return of(route, material, SHORT);
    }

    /**
     * The rule of a route: "en", "us-asd" or "us-strength". Timber in the United States is always checked by allowable stress.
     *
     * @param duration  duration class of the wind for timber by EN 1995-1-1, "short" or "instantaneous"
     * @throws UnfitAnswer  for another route or duration
     */
    public PostRule of(String route, Material material, String duration) {
        return switch (route) {
            case "en" -> switch (material) {
                case STEEL -> steelEn;
                case ALUMINIUM -> aluminium.get(AluminiumPosts.Way.EN);
                case TIMBER -> timber(duration);
            };
            case "us-asd" -> us(material, steelAllowable, AluminiumPosts.Way.ALLOWABLE);
            case "us-strength" -> us(material, steelFactored, AluminiumPosts.Way.FACTORED);
            default -> throw new UnfitAnswer("posts.check", "\"" + route + "\" is no way of checking posts; there are en, us-asd and us-strength");
        };
    }

    private PostRule timber(String duration) {
        PostRule rule = timber.get(duration);
        if (rule == null) {
            throw new UnfitAnswer("posts.load-duration", "\"" + duration + "\" is no duration of load; there are " + String.join(", ", timber.keySet()));
        }
        return rule;
    }

    private PostRule us(Material material, PostRule steel, AluminiumPosts.Way way) {
        return switch (material) {
            case STEEL -> steel;
            case ALUMINIUM -> aluminium.get(way);
            case TIMBER -> timberUs;
        };
    }
}
