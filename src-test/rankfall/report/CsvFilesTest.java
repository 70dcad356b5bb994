package rankfall.report;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import org.junit.jupiter.api.Test;
import rankfall.Analysis;
import rankfall.Analysis.Component;
import rankfall.Analysis.Findings;
import rankfall.Analysis.Status;

/** The expected texts are written by hand from the output contract and RFC 4180. */
class CsvFilesTest {
  private static Component component(Analysis a) {
    return a.findings().orElseThrow().components().get(0);
  }

  @Test
  void structureNamesGeneratorsAndWritesQuotientsInLowestTerms() {
    assertEquals(
        "left,right,target,coefficient\r\nH,X,X,2\r\nH,Y,Y,-2\r\nX,Y,H,alpha/b_1\r\n",
        CsvFiles.structure(component(SampleAnalyses.scaled())));
  }

  @Test
  void matricesListNonZeroEntriesOfTheUpperTriangle() {
    Component c = component(SampleAnalyses.scaled());
    assertEquals(
        "row,column,entry\r\nH,H,8\r\nX,Y,4*alpha/b_1\r\n",
        CsvFiles.matrix(c.basis(), c.killing().entries()));
    assertEquals(
        "row,column,entry\r\nH,H,1/8\r\nX,Y,b_1/(4*alpha)\r\n",
        CsvFiles.matrix(c.basis(), c.dual().orElseThrow()));
  }

  @Test
  void conditionsOfAllComponents() {
    Findings f = SampleAnalyses.stratified().findings().orElseThrow();
    assertEquals(
        "component,condition,multiplicity,rank,kernel_dimension,real_points\r\n"
            + "1,a,2,1,2,yes\r\n1,b,2,1,2,yes\r\n1,c,2,1,2,unknown\r\n",
        CsvFiles.conditions(f.components()));
  }

  @Test
  void strataJoinEquationsAndExclusions() {
    Findings f = SampleAnalyses.stratified().findings().orElseThrow();
    assertEquals(
        "stratum,equations,exclusions,codimension,dimension,rank,kernel_dimension,derived,centre,"
            + "radical,nilradical,class,type,real_points,witness\r\n"
            + "S1,0,a | b | c,0,3,3,0,3,0,0,0,simple,\"sl(2,C)\",yes,a=1; b=1; c=1\r\n"
            + "S2,a,b | c,1,3,1,2,2,1,2,2,solvable,,yes,a=0; b=1; c=-3/2\r\n"
            + "S3,a; b,c,2,3,0,3,1,2,3,3,nilpotent,Heisenberg,yes,a=0; b=0; c=1\r\n"
            + "S4,a; b; c,,3,3,0,3,0,3,3,3,abelian,R^3,yes,a=0; b=0; c=0\r\n",
        CsvFiles.strata(f));
  }

  @Test
  void regionsJoinConditionsAndKeepRoots() {
    Findings f = SampleAnalyses.stratified().findings().orElseThrow();
    assertEquals(
        "stratum,region,conditions,plus,minus,zero,type,proof,witness\r\n"
            + "S1,R1,a > 0; 2*a^2 - b*c > 0,2,1,0,\"sl(2,R)\",exact,"
            + "\"a=1; b=1; c=root(x^2 - 2, 1.41421356)\"\r\n"
            + "S4,R1,,0,0,3,,sampled,a=0; b=0; c=0\r\n",
        CsvFiles.regions(f));
  }

  @Test
  void summaryLeavesEmptyWhatIsNotKnown() {
    assertEquals(
        "family,status,generators,dimension,parameters,components,generic_rank,generic_plus,"
            + "generic_minus,conditions,strata,regions,type,message\r\n"
            + "scaled-sl2,complete,3,3,2,1,3,2,1,1,,,,\r\n"
            + "stretched-rotor,complete,3,3,3,1,3,,,3,4,2,\"sl(2,C)\",\r\n"
            + "scaled-sl2,incomplete,3,3,2,1,3,2,1,1,,,,the time ran out\r\n"
            + "broken,failed,2,,1,,,,,,,,,\"the closure needs [X, Y], which is not in the span;"
            + " <none> & \"\"quoted\"\"\"\r\n"
            + "unread,failed,,,,,,,,,,,,\"unknown name 'x', and more\"\r\n",
        CsvFiles.summary(
            List.of(
                SummaryRow.of(SampleAnalyses.scaled()),
                SummaryRow.of(SampleAnalyses.stratified()),
                SummaryRow.of(SampleAnalyses.scaled(Status.INCOMPLETE, "", "")),
                SummaryRow.of(SampleAnalyses.failed()),
                SummaryRow.failed("unread", "unknown name 'x', and more"))));
  }
}
