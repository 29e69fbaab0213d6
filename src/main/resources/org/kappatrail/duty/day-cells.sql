-- Day cells of temperature and speed readings; one statement for every engine.
--
-- {readings}: one row per reading, whole numbers only
--   bearing      key of the register below; 0 where the register has no such bearing
--   source       number of the file, for the count of rows per file
--   instant_ms   milliseconds since 1970-01-01T00:00Z; NULL only where fault says why
--   temperature  thousandths of a degree Celsius, NULL where there is none
--   speed        thousandths of a revolution per minute, NULL where none was logged
--   fault        0, or the ReadingState code that keeps the reading out
--   flaw         1 where the speed is a text that is not a number, else 0
-- {register}: bearing, width of a speed cell, highest speed of standstill (both in thousandths)
-- {day_shift}: milliseconds from UTC to local time at instant_ms
--
-- State codes are those of ReadingState: 0 running, 1 stopped, 2 repeated, 3 later than the review,
-- 4 to 6 not to be placed, 14 used within another reading, else dropped. Dropped readings have their own partition, so that the
-- reading before one counts to the next good one; they take part only to be counted.
WITH register (bearing, speed_step, standstill) AS (VALUES {register}),
judged AS (
  SELECT r.bearing, r.source, r.instant_ms, r.temperature, r.speed, r.flaw, g.speed_step,
    CASE
      WHEN r.fault BETWEEN 4 AND 6 THEN r.fault
      WHEN r.instant_ms >= {end_ms} THEN 3
      WHEN r.fault > 0 THEN r.fault
      WHEN r.temperature < -40000 OR r.temperature > 200000 OR r.speed > {fastest} THEN 12
      WHEN r.speed < 0 THEN 13
      WHEN r.speed <= g.standstill THEN 1
      ELSE 0
    END AS state
  FROM ({readings}) r
  LEFT JOIN register g ON g.bearing = r.bearing
),
-- Of readings at one instant the last counts: one with a speed, then the hotter one.
chained AS (
  SELECT bearing, source, instant_ms, temperature, speed, flaw, speed_step, state,
    LEAD(instant_ms) OVER (
      PARTITION BY bearing, CASE WHEN state <= 1 THEN 1 ELSE 0 END
      ORDER BY instant_ms NULLS FIRST, speed NULLS FIRST, temperature NULLS FIRST, source, flaw
    ) AS next_ms
  FROM judged
),
timed AS (
  SELECT bearing, source, instant_ms, temperature, speed, flaw, speed_step, state,
    CASE
      WHEN state > 1 THEN 0
      WHEN next_ms - instant_ms < {gap_ms} THEN next_ms - instant_ms
      ELSE {gap_ms}
    END AS ms
  FROM chained
),
placed AS (
  SELECT bearing, source, temperature, speed, flaw, speed_step, ms,
    CASE WHEN state <= 1 AND ms = 0 THEN 2 ELSE state END AS state,
    CASE WHEN ms > 0 THEN instant_ms + {day_shift} ELSE 0 END AS local_ms
  FROM timed
),
celled AS (
  SELECT bearing, source, temperature, speed, flaw, state, ms,
    local_ms - MOD(local_ms, 86400000) AS day_ms,
    CASE WHEN state = 0 THEN temperature + 40000 - MOD(temperature + 40000, 500) ELSE -1 END
      AS temperature_cell,
    CASE WHEN state = 0 AND speed IS NOT NULL THEN speed - MOD(speed, speed_step) ELSE -1 END
      AS speed_cell
  FROM placed
)
SELECT bearing, day_ms, state, temperature_cell, speed_cell, source,
  COUNT(*) AS readings,
  CAST(SUM(ms) AS BIGINT) AS ms,
  CAST(SUM(temperature * ms) AS BIGINT) AS temperature_ms,
  MIN(temperature) AS lowest,
  MAX(temperature) AS highest,
  CAST(SUM(speed * ms) AS BIGINT) AS speed_ms,
  CAST(SUM(flaw) AS BIGINT) AS flaws
FROM celled
GROUP BY bearing, day_ms, state, temperature_cell, speed_cell, source
ORDER BY bearing, day_ms, state, temperature_cell, speed_cell, source
