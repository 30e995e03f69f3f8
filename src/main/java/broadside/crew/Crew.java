package broadside.crew;

import broadside.table.Edition;
import broadside.table.TableLibrary;

/** Everything that a crew is told about the wind, with all its tables read. */
public final class Crew {

    private final ActionLevels levels;
    private final LeadTime leadTime;
    private final EvacuationClasses classes;
    private final PublishedLimits limits;
    private final Handling handling;
    private final PersonInWind person;
    private final CraneWind crane;

    /** Reads the tables of crews, and of open flow the relation for slanting plates; a missing table stops the start. */
    public Crew(TableLibrary tables) {
        Edition crew = tables.edition("crew/1").orElseThrow();
        this.levels = new ActionLevels(crew);
        this.leadTime = new LeadTime(crew, levels);
        this.classes = new EvacuationClasses(crew);
        this.limits = new PublishedLimits(crew);
        this.handling = new Handling(crew, tables.edition("open-flow/1").orElseThrow());
        this.person = new PersonInWind(crew);
        this.crane = new CraneWind(crew);
    }

    public ActionLevels levels() {
        return levels;
    }

    public LeadTime leadTime() {
        return leadTime;
    }

    public EvacuationClasses classes() {
        return classes;
    }

    public PublishedLimits limits() {
        return limits;
    }

    public Handling handling() {
        return handling;
    }

    public PersonInWind person() {
        return person;
    }

    public CraneWind crane() {
        return crane;
    }
}
