package broadside;

import broadside.assess.Assessor;
import broadside.job.*;
import broadside.site.SpeedConversion;
import broadside.table.TableLibrary;

public final class Main {
    public static void main(String[] args) {
        TableLibrary tables = TableLibrary.shipped();
        Assessor assessor = new Assessor(tables);
        SpeedConversion conversion = new SpeedConversion(tables.edition("gust-factors/1").orElseThrow().curve("durst"));
        JobReader reader = new JobReader(assessor.codes(), conversion);
        int passed = 0, failed = 0;
        for (PublishedCheck check : new PublishedChecks(assessor, reader, conversion).shipped()) {
            for (PublishedCheck.Line line : check.lines()) {
                if (!line.passed()) System.out.println(check.file() + " " + line);
            }
            if (check.passed()) passed++; else failed++;
        }
        System.out.println(passed + " passed, " + failed + " failed");
    }
}
