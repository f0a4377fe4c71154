-- The work of a run as closely as SQL says it, over the same files. Values in ${...} are filled in by the benchmark.
--
-- Left out, because SQL says it badly or not at all: the quarantine with rule, file, line and raw text (a broken row is
-- only dropped), fingerprints, findings and accounts; the arrival window and overlapping admissions; masking by kidney
-- replacements; FALL_7D, gradual rises, the closing, lapse, stage, course and outcome of episodes (a hit of a criterion
-- stands for an onset); links with their doses, burden and combinations; setting aside of cuff readings; the second
-- attribution; the cube by day; the lines behind an episode's page; exact limits, ratios and q values.

-- part: patients, admissions, stays
CREATE TABLE patients AS
SELECT DISTINCT patient_id, TRY_CAST(birth_date AS DATE) AS birth_date,
       timezone('${zone}', TRY_CAST(died_at AS TIMESTAMP)) AS died_at
FROM read_csv(${patients}, header = true, all_varchar = true, union_by_name = true)
WHERE patient_id IS NOT NULL AND sex IN ('female', 'male', 'other', 'unknown') AND birth_date IS NOT NULL;

CREATE TABLE admissions AS
SELECT DISTINCT a.admission_id, a.patient_id,
       timezone('${zone}', TRY_CAST(a.admitted_at AS TIMESTAMP)) AS admitted_at,
       coalesce(timezone('${zone}', TRY_CAST(a.discharged_at AS TIMESTAMP)), TIMESTAMPTZ '${covers_to}') AS discharged_at
FROM read_csv(${admissions}, header = true, all_varchar = true, union_by_name = true) a
SEMI JOIN patients USING (patient_id)
WHERE TRY_CAST(a.admitted_at AS TIMESTAMP) IS NOT NULL;

CREATE TABLE units AS
SELECT DISTINCT unit_id, kind FROM read_csv(${units}, header = true, all_varchar = true, union_by_name = true);

CREATE TABLE code_map AS
SELECT DISTINCT "table" AS mapped, local_code, code
FROM read_csv(${code_map}, header = true, all_varchar = true, union_by_name = true);

CREATE TABLE stays AS
SELECT DISTINCT s.admission_id, a.patient_id, s.unit_id, u.kind,
       timezone('${zone}', TRY_CAST(s.entered_at AS TIMESTAMP)) AS entered_at,
       coalesce(timezone('${zone}', TRY_CAST(s.left_at AS TIMESTAMP)), a.discharged_at) AS left_at
FROM read_csv(${unit_stays}, header = true, all_varchar = true, union_by_name = true) s
JOIN admissions a USING (admission_id) JOIN units u USING (unit_id)
WHERE TRY_CAST(s.entered_at AS TIMESTAMP) IS NOT NULL;

-- part: results
CREATE TABLE results AS
WITH raw AS (
  SELECT DISTINCT patient_id, admission_id, analyte, code_system, collected_at, resulted_at, value, unit, status, setting
  FROM read_csv(${results}, header = true, all_varchar = true, union_by_name = true)),
typed AS (
  SELECT r.patient_id, r.setting,
         timezone('${zone}', TRY_CAST(r.collected_at AS TIMESTAMP)) AS taken_at,
         round(TRY_CAST(ltrim(r.value, '<> ') AS DECIMAL(18, 6))
           * CASE lower(replace(replace(r.unit, chr(181), 'u'), chr(956), 'u'))
               WHEN 'mg/dl' THEN 88400 WHEN 'umol/l' THEN 1000 WHEN 'mg/l' THEN 8840 WHEN 'mmol/l' THEN 1000000 END)::BIGINT
           AS nanomoles
  FROM raw r LEFT JOIN code_map m ON m.mapped = 'results' AND r.code_system = 'local' AND m.local_code = r.analyte
  SEMI JOIN patients p ON p.patient_id = r.patient_id
  WHERE coalesce(m.code, r.analyte) IN ('2160-0', '38483-4', '14682-9', '77140-2', '21232-4', '59826-8')
    AND coalesce(r.status, 'final') IN ('final', 'corrected')
    AND (r.admission_id IS NULL OR r.admission_id IN (SELECT admission_id FROM admissions)))
SELECT patient_id, taken_at, min(nanomoles) AS nanomoles, min(coalesce(setting, 'unknown')) AS setting
FROM typed WHERE nanomoles BETWEEN 8840 AND 3536000 AND taken_at < TIMESTAMPTZ '${covers_to}'
GROUP BY patient_id, taken_at;

-- part: administrations
CREATE TABLE administrations AS
WITH raw AS (
  SELECT DISTINCT patient_id, admission_id, drug, code_system, drug_name, route, started_at, ended_at, dose, dose_unit, action, basis
  FROM read_csv(${administrations}, header = true, all_varchar = true, union_by_name = true))
SELECT r.patient_id, coalesce(m.code, r.drug) AS atc, r.route,
       timezone('${zone}', TRY_CAST(r.started_at AS TIMESTAMP)) AS started_at,
       timezone('${zone}', TRY_CAST(r.ended_at AS TIMESTAMP)) AS ended_at
FROM raw r LEFT JOIN code_map m ON m.mapped = 'administrations' AND r.code_system = 'local' AND m.local_code = r.drug
SEMI JOIN patients p ON p.patient_id = r.patient_id
WHERE coalesce(r.action, 'given') = 'given' AND coalesce(r.basis, 'administered') = 'administered'
  AND (r.admission_id IS NULL OR r.admission_id IN (SELECT admission_id FROM admissions))
  AND TRY_CAST(r.started_at AS TIMESTAMP) IS NOT NULL;

-- part: blood pressures
CREATE TABLE pressures AS
WITH raw AS (
  SELECT DISTINCT patient_id, admission_id, measured_at, systolic, diastolic, mean, method
  FROM read_csv(${blood_pressures}, header = true, all_varchar = true, union_by_name = true)),
typed AS (
  SELECT r.patient_id, timezone('${zone}', TRY_CAST(r.measured_at AS TIMESTAMP)) AS taken_at,
         TRY_CAST(r.systolic AS DECIMAL(9, 3)) AS systolic, TRY_CAST(r.diastolic AS DECIMAL(9, 3)) AS diastolic,
         TRY_CAST(r.mean AS DECIMAL(9, 3)) AS mean
  FROM raw r SEMI JOIN patients p ON p.patient_id = r.patient_id
  WHERE (r.admission_id IS NULL OR r.admission_id IN (SELECT admission_id FROM admissions))),
plausible AS (
  SELECT patient_id, taken_at, CASE WHEN systolic BETWEEN 30 AND 300 THEN systolic END AS systolic,
         CASE WHEN diastolic BETWEEN 10 AND 225 AND NOT (systolic BETWEEN 30 AND 300 AND diastolic > systolic - 5)
              THEN diastolic END AS diastolic,
         CASE WHEN mean BETWEEN 20 AND 250 THEN mean END AS mean
  FROM typed WHERE taken_at < TIMESTAMPTZ '${covers_to}')
SELECT patient_id, taken_at, min(coalesce(mean, (2 * diastolic + systolic) / 3)) AS map, min(systolic) AS systolic
FROM plausible WHERE coalesce(mean, systolic, diastolic) IS NOT NULL
GROUP BY patient_id, taken_at;

-- part: other tables
CREATE TABLE others AS
SELECT count(DISTINCT (patient_id, started_at, modality)) AS number
FROM read_csv(${kidney_replacements}, header = true, all_varchar = true, union_by_name = true)
WHERE TRY_CAST(started_at AS TIMESTAMP) IS NOT NULL
UNION ALL
SELECT count(DISTINCT (patient_id, code, recorded_at))
FROM read_csv(${conditions}, header = true, all_varchar = true, union_by_name = true)
UNION ALL
SELECT count(DISTINCT (patient_id, ended_at, volume_ml))
FROM read_csv(${urine_outputs}, header = true, all_varchar = true, union_by_name = true)
WHERE TRY_CAST(volume_ml AS DOUBLE) IS NOT NULL
UNION ALL
SELECT count(DISTINCT (patient_id, measured_at, height_cm))
FROM read_csv(${body_measures}, header = true, all_varchar = true, union_by_name = true);

-- part: criteria
CREATE TABLE placed AS
SELECT r.*, CASE WHEN r.taken_at < a.discharged_at THEN a.admission_id END AS admission_id, a.admitted_at
FROM results r ASOF LEFT JOIN admissions a ON r.patient_id = a.patient_id AND r.taken_at >= a.admitted_at;

CREATE TABLE baselines AS
SELECT a.admission_id, median(p.nanomoles) AS baseline
FROM admissions a JOIN placed p ON p.patient_id = a.patient_id
WHERE p.admission_id IS NULL AND p.setting NOT IN ('inpatient', 'emergency')
  AND p.taken_at BETWEEN a.admitted_at - INTERVAL 365 DAY AND a.admitted_at - INTERVAL 7 DAY
GROUP BY a.admission_id;

CREATE TABLE hits AS
WITH windows AS (
  SELECT *, min(nanomoles) OVER (PARTITION BY patient_id ORDER BY taken_at
              RANGE BETWEEN INTERVAL 48 HOUR PRECEDING AND CURRENT ROW EXCLUDE CURRENT ROW) AS lowest48,
         min(nanomoles) OVER (PARTITION BY patient_id ORDER BY taken_at
              RANGE BETWEEN INTERVAL 7 DAY PRECEDING AND CURRENT ROW EXCLUDE CURRENT ROW) AS lowest7
  FROM placed)
SELECT w.patient_id, w.admission_id, w.taken_at, w.nanomoles, w.lowest48, w.lowest7, b.baseline
FROM windows w LEFT JOIN baselines b USING (admission_id)
WHERE w.nanomoles - w.lowest48 >= 26500 OR 2 * w.nanomoles >= 3 * w.lowest7
   OR (2 * w.nanomoles >= 3 * b.baseline AND w.taken_at < w.admitted_at + INTERVAL 7 DAY);

CREATE TABLE at_risk AS
WITH onsets AS (SELECT patient_id, admission_id, min(taken_at) AS onset FROM hits WHERE admission_id IS NOT NULL GROUP BY ALL)
SELECT a.admission_id, a.patient_id, o.onset, a.admitted_at + INTERVAL 48 HOUR AS from_at,
       least(coalesce(o.onset, a.discharged_at), a.discharged_at, coalesce(p.died_at, a.discharged_at),
             TIMESTAMPTZ '${covers_to}') AS to_at
FROM admissions a JOIN patients p USING (patient_id) LEFT JOIN onsets o USING (patient_id, admission_id)
WHERE a.admission_id IN (SELECT admission_id FROM placed GROUP BY admission_id HAVING count(*) >= 2);

-- part: exposure
CREATE TABLE exposures AS
WITH codes AS (SELECT DISTINCT atc FROM administrations),
matched AS (
  SELECT c.atc, w.* EXCLUDE (atc) FROM codes c JOIN read_csv('${watchlist}', header = true, all_varchar = true) w
    ON starts_with(c.atc, w.atc)
  QUALIFY length(w.atc) = max(length(w.atc)) OVER (PARTITION BY c.atc)),
intervals AS (
  SELECT d.patient_id, m.agent, d.started_at + INTERVAL (m.lag_hours::INT) HOUR AS from_at,
         greatest(d.started_at, d.ended_at) + INTERVAL (m.look_back_days::INT) DAY AS to_at
  FROM administrations d JOIN matched m ON m.atc = d.atc AND list_contains(string_split(m.routes, ';'), d.route)),
marked AS (
  SELECT *, CASE WHEN from_at <= max(to_at) OVER (PARTITION BY patient_id, agent ORDER BY from_at
                 ROWS BETWEEN UNBOUNDED PRECEDING AND 1 PRECEDING) THEN 0 ELSE 1 END AS starts
  FROM intervals WHERE from_at < to_at),
islands AS (
  SELECT *, sum(starts) OVER (PARTITION BY patient_id, agent ORDER BY from_at ROWS UNBOUNDED PRECEDING) AS island
  FROM marked)
SELECT patient_id, agent, min(from_at) AS from_at, max(to_at) AS to_at FROM islands GROUP BY patient_id, agent, island;

-- part: spells
CREATE TABLE spells AS
WITH placed_pressures AS (
  SELECT p.*, s.kind, s.admission_id
  FROM pressures p ASOF LEFT JOIN stays s ON p.patient_id = s.patient_id AND p.taken_at >= s.entered_at),
held AS (
  SELECT *, least(coalesce(lead(taken_at) OVER w, TIMESTAMPTZ '${covers_to}'),
                  taken_at + CASE WHEN kind = 'critical-care' THEN INTERVAL 15 MINUTE ELSE INTERVAL 60 MINUTE END) AS to_at,
         (map < 65 OR (map IS NULL AND systolic < 90)) AS low
  FROM placed_pressures WINDOW w AS (PARTITION BY patient_id ORDER BY taken_at)),
marked AS (
  SELECT *, CASE WHEN low AND lag(low) OVER w AND lag(admission_id) OVER w = admission_id
                  AND taken_at - lag(to_at) OVER w <= INTERVAL 4 HOUR THEN 0 ELSE 1 END AS starts
  FROM held WINDOW w AS (PARTITION BY patient_id ORDER BY taken_at)),
runs AS (SELECT *, sum(starts) OVER (PARTITION BY patient_id ORDER BY taken_at ROWS UNBOUNDED PRECEDING) AS run FROM marked)
SELECT patient_id, min(taken_at) AS from_at, max(to_at) AS to_at
FROM runs WHERE low GROUP BY patient_id, run HAVING sum(epoch(to_at) - epoch(taken_at)) >= 600;

-- part: time at risk
CREATE TABLE risk_by_unit AS
WITH months AS (
  SELECT timezone('${zone}', m) AS from_at, timezone('${zone}', m + INTERVAL 1 MONTH) AS to_at, m
  FROM generate_series(TIMESTAMP '${covers_from}', TIMESTAMP '${covers_to}' - INTERVAL 1 DAY, INTERVAL 1 MONTH) t(m))
SELECT strftime(m.m, '%Y-%m') AS month, s.unit_id,
       sum(epoch(least(r.to_at, s.left_at, m.to_at)) - epoch(greatest(r.from_at, s.entered_at, m.from_at))) AS seconds,
       count(*) FILTER (r.onset = r.to_at AND r.onset >= s.entered_at AND r.onset <= s.left_at
                        AND r.onset >= m.from_at AND r.onset < m.to_at) AS episodes
FROM at_risk r JOIN stays s USING (admission_id)
JOIN months m ON greatest(r.from_at, s.entered_at) < m.to_at AND least(r.to_at, s.left_at) > m.from_at
WHERE greatest(r.from_at, s.entered_at) < least(r.to_at, s.left_at)
GROUP BY ALL;

CREATE TABLE risk_by_agent AS
SELECT e.agent, sum(epoch(least(r.to_at, e.to_at)) - epoch(greatest(r.from_at, e.from_at))) AS seconds,
       count(*) FILTER (r.onset = r.to_at AND r.onset >= e.from_at AND r.onset < e.to_at) AS episodes
FROM at_risk r JOIN exposures e ON r.patient_id = e.patient_id AND r.from_at < e.to_at AND r.to_at > e.from_at
WHERE r.from_at < r.to_at GROUP BY ALL;

CREATE TABLE risk_after_low_pressure AS
SELECT sum(epoch(least(r.to_at, s.to_at + INTERVAL 48 HOUR)) - epoch(greatest(r.from_at, s.from_at))) AS seconds
FROM at_risk r JOIN spells s ON r.patient_id = s.patient_id
  AND r.from_at < s.to_at + INTERVAL 48 HOUR AND r.to_at > s.from_at
WHERE r.from_at < r.to_at;

-- part: writing
COPY hits TO '${out}/hits.parquet' (FORMAT parquet);
COPY spells TO '${out}/spells.parquet' (FORMAT parquet);
COPY exposures TO '${out}/exposures.parquet' (FORMAT parquet);
COPY at_risk TO '${out}/at_risk.parquet' (FORMAT parquet);
COPY risk_by_unit TO '${out}/risk_by_unit.parquet' (FORMAT parquet);
COPY risk_by_agent TO '${out}/risk_by_agent.parquet' (FORMAT parquet);
