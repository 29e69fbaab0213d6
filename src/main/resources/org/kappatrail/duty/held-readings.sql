-- Readings from events of tags, for DuckDB: an event carries temperature or speed or both.
--
-- {events}: source, row_number, overflow, time_text, clock_ms, zoned, quality_text (of the row),
--   tag_text, asset_text and name_text (what an unknown bearing is reported by), bearing, rank (0 with a temperature, 1 speed alone, 2 quality alone),
--   temperature_text, temperature_c, speed_text, speed_rpm, mark_text (of a tag of quality)
--
-- A cell that is not empty and no usable number ends the value before it: it is held as -2147483648.
-- A negative speed is seen at its own instant, where it drops the reading, and not held.
WITH events AS ({events}),
parsed AS (
  SELECT *, {instant} AS instant_ms, {temperature} AS temperature, {speed} AS speed
  FROM events
),
marked AS (
  SELECT *,
    {mark} AS mark
  FROM parsed
),
judged AS (
  SELECT *,
    CASE
      WHEN trim(overflow) <> '' THEN 5
      WHEN instant_ms IS NULL THEN 4
      WHEN bearing = 0 THEN 6
      WHEN {is_not_good} THEN {bad_quality}
      WHEN mark > 0 THEN mark
      WHEN temperature IS NULL AND trim(temperature_text) <> '' THEN {no_temperature}
      WHEN rank = 0 AND temperature IS NULL AND tag_text IS NOT NULL THEN 9
      WHEN rank = 1 AND speed IS NULL AND COALESCE(trim(speed_text), '') = '' THEN 9
      ELSE 0
    END AS own_fault,
    {flaw} AS flaw
  FROM marked
),
coded AS (
  SELECT *,
    CASE
      WHEN temperature BETWEEN -40000 AND 200000 AND own_fault = 0 THEN temperature
      WHEN trim(temperature_text) <> '' THEN -2147483648
    END AS temperature_code,
    CASE
      WHEN speed IS NOT NULL AND own_fault NOT IN (7, 8) THEN speed
      WHEN trim(speed_text) <> '' THEN -2147483648
    END AS speed_code
  FROM judged
),
gathered AS (
  SELECT *,
    MAX(temperature_code) OVER instant AS temperature_here,
    MAX(speed_code) OVER instant AS speed_here,
    MIN(rank) OVER instant AS least_rank,
    ROW_NUMBER() OVER (
      PARTITION BY bearing, instant_ms
      ORDER BY rank, CASE WHEN own_fault > 0 THEN 1 ELSE 0 END, temperature DESC NULLS LAST,
        speed DESC NULLS LAST, source, own_fault, flaw
    ) AS place
  FROM coded
  WINDOW instant AS (PARTITION BY bearing, instant_ms)
),
held AS (
  SELECT *,
    LAST_VALUE(temperature_here IGNORE NULLS) OVER past AS temperature_held,
    LAST_VALUE(speed_here IGNORE NULLS) OVER past AS speed_held,
    MAX(CASE WHEN temperature_here IS NOT NULL THEN instant_ms END) OVER past AS temperature_ms,
    MAX(CASE WHEN speed_here IS NOT NULL THEN instant_ms END) OVER past AS speed_ms
  FROM gathered
  WINDOW past AS (
    PARTITION BY bearing ORDER BY instant_ms NULLS FIRST
    ROWS BETWEEN UNBOUNDED PRECEDING AND CURRENT ROW
  )
),
filled AS (
  SELECT *,
    CASE
      WHEN own_fault > 0 OR temperature NOT BETWEEN -40000 AND 200000 THEN temperature
      WHEN temperature_held > -2147483648 AND instant_ms - temperature_ms <= {gap_ms}
        THEN temperature_held
      ELSE temperature
    END AS temperature_now,
    CASE
      WHEN speed_held >= 0 AND instant_ms - speed_ms <= {gap_ms} THEN speed_held
      WHEN speed_held > -2147483648 AND instant_ms = speed_ms THEN speed_held
    END AS speed_now
  FROM held
)
SELECT bearing, source, instant_ms, temperature_now AS temperature, speed_now AS speed,
  CASE
    WHEN own_fault > 0 THEN own_fault
    WHEN rank > least_rank THEN 14
    WHEN place > 1 THEN 2
    WHEN temperature_now IS NULL THEN 9
    ELSE 0
  END AS fault,
  flaw, time_text, COALESCE(asset_text, '') AS asset_text, name_text AS bearing_text,
  temperature_text, speed_text, COALESCE(mark_text, quality_text) AS quality_text, row_number
FROM filled
