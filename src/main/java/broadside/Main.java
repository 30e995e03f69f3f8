package broadside;

import broadside.assess.Assessor;
import broadside.job.*;
import broadside.site.SpeedConversion;
import broadside.table.TableLibrary;

public final class Main {
    public static void main(String[] args) throws Exception {
        TableLibrary tables = TableLibrary.shipped();
        Assessor assessor = new Assessor(tables);
        SpeedConversion conversion = new SpeedConversion(tables.edition("gust-factors/1").orElseThrow().curve("durst"));
        JobReader reader = new JobReader(assessor.codes(), conversion);
        System.out.write(JobText.write(ResultText.of(assessor.assess(reader.read(java.nio.file.Files.readAllBytes(java.nio.file.Path.of(args[0])))))));
    }
}
