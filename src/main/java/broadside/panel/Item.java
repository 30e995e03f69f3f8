package broadside.panel;

import java.util.List;

/** One thing that stands in the wind. */
public sealed interface Item permits PostSign, Hoarding, BannerFence, FacadePanel, ProjectingSign, SpannedBanner {

    /** Mark of the item in the job, such as S1. */
    String mark();

    /** Kind as written in a job file. */
    String kind();

    /** The flat panels it is made of, from the left. */
    List<Panel> panels();

    /** What carries it, as typed and in the words of the job file; not every part of it is checked. */
    List<Carrying> carrying();

    /** Decides by kind. A new kind becomes one more method of {@link Kinds}, and the compiler names every place that must decide. */
    <R> R choose(Kinds<R> kinds);

    /** One line of what carries the item, as typed. */
    record Carrying(String name, String typed) { }

    /** One answer for each kind of item. */
    interface Kinds<R> {

        R postSign(PostSign sign);

        R hoarding(Hoarding hoarding);

        R bannerFence(BannerFence fence);

        R facadePanel(FacadePanel facade);

        R projectingSign(ProjectingSign sign);

        R spannedBanner(SpannedBanner banner);
    }
}
