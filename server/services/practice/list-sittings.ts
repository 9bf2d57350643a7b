import { select } from '#server/db/scope.ts';
import type { Scope } from '#server/services/people/load-scope.ts';
import { daysBetween } from '#shared/domain/time/calendar.ts';
import type { SittingDto } from '#shared/schemas/curriculum.ts';
import { STUDY } from './study-sql.ts';

interface Row {
  id: string;
  paper_id: string;
  subject_id: string;
  subject_code: string;
  subject_name: string;
  strand: string;
  paper_title: string;
  season: string;
  sat_on: string;
  starts_at: string;
  minutes: number;
  source: string;
}

/** Most sittings one student can have ahead in a year, many times over. */
const MOST = 200;

interface Arrangement {
  extra_time_percent: number;
  has_rest_breaks: boolean;
}

/** One's own access arrangement; nobody else's can be asked for here. */
async function ownArrangement({ actor }: Scope): Promise<Arrangement | undefined> {
  const rows = await select<Arrangement>(
    'SELECT extra_time_percent, has_rest_breaks FROM access_arrangements WHERE user_id = $1',
    [actor.userId],
  );
  return rows[0];
}

/** The acting student's sittings still to start, soonest first, each with the time they personally have. */
export async function listSittings(scope: Scope): Promise<SittingDto[]> {
  const { actor, today, now } = scope;
  const rows = await select<Row>(
    `WITH ${STUDY}
     SELECT s.id, paper.id AS paper_id, sub.id AS subject_id, sub.code AS subject_code, sub.name AS subject_name,
       sub.strand, paper.title AS paper_title, season.name AS season, to_char(s.sat_on, 'YYYY-MM-DD') AS sat_on,
       to_char(s.starts_at, 'HH24:MI') AS starts_at, paper.minutes, s.source
     FROM paper
     JOIN sittings s ON s.paper_id = paper.id
     JOIN seasons season ON season.id = s.season_id
     JOIN subjects sub ON sub.id = paper.subject_id
     WHERE (s.sat_on + s.starts_at) AT TIME ZONE s.zone > $3
     ORDER BY s.sat_on, s.starts_at, sub.position, s.id
     LIMIT ${MOST}`,
    [actor.userId, today, now],
  );
  const arrangement = await ownArrangement(scope);
  const extraOf = (minutes: number) => Math.round((minutes * (arrangement?.extra_time_percent ?? 0)) / 100);
  return rows.map((row) => ({
    id: row.id,
    paperId: row.paper_id,
    subject: { id: row.subject_id, code: row.subject_code, name: row.subject_name, strand: row.strand },
    paperTitle: row.paper_title,
    season: row.season,
    on: row.sat_on,
    startsAt: row.starts_at,
    minutes: row.minutes + extraOf(row.minutes),
    extraMinutes: extraOf(row.minutes),
    hasRestBreaks: arrangement?.has_rest_breaks ?? false,
    daysAway: daysBetween(today, row.sat_on),
    source: row.source,
  }));
}
