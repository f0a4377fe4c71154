package millrace.analytics.export;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;
import millrace.analytics.mart.Columns;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;

/** The columns of the exports, in order. */
final class ExportTableTest {
  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "admissions | admission_id,patient_id,class,baseline_mg_dl,results,at_risk_days",
        "episodes | patient_id,admission_id,onset_at,origin,evidence,reference_mg_dl,onset_mg_dl,peak_mg_dl,peak_at,stage,closed_at,course,prolonged,outcome,unit_at_onset,unit_day_before,linked_agents,burden,combinations,minutes_low,lowest_map,area_under_floor,observed_hours,spells,vasopressor,recent_hypotension",
        "gradual_rises | patient_id,admission_id,first_at,reference_mg_dl,value_mg_dl",
        "unit_rates | month,unit_id,attribution,at_risk_days,episodes,stage2plus,rate,lower,upper",
        "drug_rates | level,subject,exposed_days,exposed_episodes,unexposed_days,unexposed_episodes,rate_ratio,lower,upper,p_mid,mh_ratio,mh_lower,mh_upper,q",
        "links | patient_id,onset_at,agent,class,mechanism,first_dose_at,last_dose_at,dose_days,doses",
        "flow | class,admissions",
        "quarantine | table,file,line,rule,column,raw"
      })
  void columnsAreThosePromised(String table, String columns) {
    assertEquals(
        columns,
        ExportTable.named(table).orElseThrow().columns().stream()
            .map(ExportColumn::name)
            .collect(Collectors.joining(",")));
  }

  @ParameterizedTest
  @EnumSource(ExportTable.class)
  void everyColumnComesFromOneOfThePublishedTable(ExportTable table) {
    List<String> published = Columns.of(table.table().rowType());

    table
        .columns()
        .forEach(c -> assertTrue(published.contains(c.source()), () -> table + " " + c.source()));
  }

  @Test
  void tableOfAnotherNameIsNone() {
    assertEquals(Optional.empty(), ExportTable.named("Episodes"));
  }
}
