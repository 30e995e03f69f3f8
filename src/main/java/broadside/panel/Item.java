package broadside.panel;

import java.util.List;
import java.util.function.Function;

/** One thing that stands in the wind. */
public sealed interface Item permits PostSign, Hoarding {

    /** Mark of the item in the job, such as S1. */
    String mark();

    /** Kind as written in a job file. */
    String kind();

    /** The flat panels it is made of, from the left. */
    List<Panel> panels();

    /** What carries it, as typed and in the words of the job file; not every part of it is checked. */
    List<Carrying> carrying();

    /** Decides by kind. A new kind becomes one more parameter, and the compiler names every place that must decide. */
    <R> R choose(Function<PostSign, R> postSign, Function<Hoarding, R> hoarding);

    /** One line of what carries the item, as typed. */
    record Carrying(String name, String typed) { }
}
