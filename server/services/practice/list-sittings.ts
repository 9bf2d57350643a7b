import { select } from '#server/db/scope.ts';
import type { Scope } from '#server/services/people/load-scope.ts';
import { daysBetween } from '#shared/domain/time/calendar.ts';
import type { SittingDto } from '#shared/schemas/curriculum.ts';

interface Row {
  id: string;
  subject_id: string;
  subject_code: string;
  subject_name: string;
  strand: string;
  paper_title: string;
  season: string;
  sat_on: string;
  starts_at: string;
  minutes: number;
  extra_percent: number | null;
  source: string;
}

/** Most sittings one student can have ahead in a year, many times over. */
const MOST = 200;

/**
 * The acting student's sittings still to start, soonest first, each with the time they personally have. Their own
 * access arrangement is read here and shown only as their own minutes.
 */
export async function listSittings({ actor, today, now }: Scope): Promise<SittingDto[]> {
  const rows = await select<Row>(
    `SELECT s.id, sub.id AS subject_id, sub.code AS subject_code, sub.name AS subject_name, sub.strand,
       p.title AS paper_title, season.name AS season, to_char(s.sat_on, 'YYYY-MM-DD') AS sat_on,
       to_char(s.starts_at, 'HH24:MI') AS starts_at, p.minutes, aa.extra_time_percent AS extra_percent, s.source
     FROM enrolments e
     JOIN classes c ON c.id = e.class_id
     JOIN papers p ON p.specification_id = c.specification_id
       AND (p.tier IS NULL OR p.tier = e.tier) AND (p.option IS NULL OR p.option = e.option)
     JOIN sittings s ON s.paper_id = p.id
     JOIN seasons season ON season.id = s.season_id
     JOIN subjects sub ON sub.id = c.subject_id
     LEFT JOIN access_arrangements aa ON aa.user_id = e.user_id
     WHERE e.user_id = $1 AND e.valid_from <= $2 AND (e.valid_to IS NULL OR e.valid_to >= $2)
       AND (s.sat_on + s.starts_at) AT TIME ZONE s.zone > $3
     ORDER BY s.sat_on, s.starts_at, sub.position, s.id
     LIMIT ${MOST}`,
    [actor.userId, today, now],
  );
  return rows.map((row) => ({
    id: row.id,
    subject: { id: row.subject_id, code: row.subject_code, name: row.subject_name, strand: row.strand },
    paperTitle: row.paper_title,
    season: row.season,
    on: row.sat_on,
    startsAt: row.starts_at,
    minutes: Math.round(row.minutes * (1 + (row.extra_percent ?? 0) / 100)),
    daysAway: daysBetween(today, row.sat_on),
    source: row.source,
  }));
}
