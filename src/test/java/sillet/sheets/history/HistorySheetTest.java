package sillet.sheets.history;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.io.StringWriter;
import org.junit.jupiter.api.Test;
import sillet.logbook.visits.CheckKind;
import sillet.logbook.visits.Moment;
import sillet.sheets.job.DemoVisit;

class HistorySheetTest {
  @Test
  void tellsBeforeAndAfterOfEachString() throws IOException {
    DemoVisit visit = new DemoVisit();
    visit.check(CheckKind.ACTION, 1, Moment.RECEIVED, 1.7);
    visit.check(CheckKind.RELIEF, 0, Moment.LEFT, 0.2);
    visit.read(1, 1, 12, "5.0");
    visit.move(1, 1, 1.86, 3.72);
    visit.read(2, 1, 12, "0.1");

    StringWriter out = new StringWriter();
    new HistorySheet(out).write(visit.record(), visit.passes());

    assertThat(out.toString().lines())
        .containsExactly(
            "ticket,taken_in,handed_out,technician,instrument,serial,tag,set,tuning,string,pitch,"
                + "gauge_in,passes,cents12_received,cents12_left,saddle_moved_mm,"
                + "action12_received_mm,action12_left_mm,relief_received_mm,relief_left_mm,"
                + "humidity_pct,temperature_c,request",
            "42,2026-01-15,2026-01-17,Ilse (demo),Plover (demo),D-1,T-9,Light (demo),two,1,E4,"
                + "0.010,2,5.00,0.10,1.860,1.7,,,0.2,47,20.5,\"Set it up, please\"",
            "42,2026-01-15,2026-01-17,Ilse (demo),Plover (demo),D-1,T-9,Light (demo),two,2,E2,"
                + "0.046,0,,,,,,,0.2,47,20.5,\"Set it up, please\"");
  }
}
