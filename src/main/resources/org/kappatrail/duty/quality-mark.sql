-- The quality that a tag of quality gives a bearing: it holds until it changes, however long.
CASE WHEN instant_ms IS NULL OR bearing = 0 THEN 0 ELSE COALESCE(
  LAST_VALUE(
    CASE
      WHEN trim(mark_text) = '' THEN NULL
      WHEN {mark_is_not_good} THEN {bad_mark}
      WHEN mark_text IS NOT NULL THEN 0
    END IGNORE NULLS
  ) OVER (
    PARTITION BY bearing
    ORDER BY instant_ms NULLS FIRST, rank DESC, mark_text NULLS FIRST
    ROWS BETWEEN UNBOUNDED PRECEDING AND CURRENT ROW
  ), 0) END
