// The two statements of the hot path, prepared by name: reading all that grading needs, and recording an answer with
// everything that follows from it as one atomic statement.

/** $1 user, $2 problem, $3 the topics whose levels are wanted, null for all. One row or none; the owner stands in the WHERE. Answers come in no order: the caller sorts. */
export const loadSql = `
select json_build_object(
    'id', p.id, 'family', p.family, 'version', p.version, 'seed', p.seed, 'tier', p.tier, 'context', p.context,
    'hints', p.hints, 'drillId', p.drill_id, 'position', p.position, 'drillLength', d.length, 'closedAt', p.closed_at
  ) as problem,
  coalesce((
    select json_agg(json_build_object('id', a.id, 'part', a.part, 'response', a.response, 'read', a.read, 'value', a.value,
      'verdict', a.verdict, 'slip', a.slip, 'attempt', a.attempt, 'isFirst', a.is_first, 'key', a.key))
    from answer a where a.user_id = p.user_id and a.problem_id = p.id), '[]'::json) as answers,
  case when ab.user_id is null then null
    else json_build_object('mean', ab.mean, 'variance', ab.variance, 'sequence', ab.sequence) end as ability,
  coalesce((
    select json_agg(json_build_object('topic', t.topic, 'mean', t.mean, 'variance', t.variance, 'answers', t.answers,
      'right', t."right", 'days', t.days, 'lastDay', t.last_day, 'lastAt', t.last_at, 'reachedAt', t.reached_at))
    from topic_level t where t.user_id = p.user_id and ($3::text[] is null or t.topic = any($3::text[]))), '[]'::json) as topics
from problem p
left join drill d on d.user_id = p.user_id and d.id = p.drill_id
left join ability ab on ab.user_id = p.user_id
where p.user_id = $1 and p.id = $2`;

const answersAndLevels = `
with own as (
  update ability set mean = $3::float8, variance = $4::float8, sequence = sequence + 1
  where user_id = $1::uuid and sequence = $2::int returning user_id
), answers as (
  insert into answer (user_id, id, problem_id, family, version, tier, part, topic, context, response, read, value,
    verdict, slip, attempt, is_first, hints, choices, seconds, key, at)
  select own.user_id, r.id, $5::uuid, $6::text, $7::int, $8::smallint, r.part, r.topic, $9::text, r.response, r.read,
    r.value, r.verdict, r.slip, r.attempt, r.is_first, r.hints, r.choices, r.seconds, r.key, $10::timestamptz
  from own, jsonb_to_recordset($11::jsonb) as r(id uuid, part text, topic text, response jsonb, read text, value text,
    verdict text, slip text, attempt smallint, is_first boolean, hints smallint, choices smallint, seconds int, key uuid)
), levels as (
  insert into topic_level (user_id, topic, mean, variance, answers, "right", days, last_day, last_at, reached_at)
  select own.user_id, r.topic, r.mean, r.variance, r.answers, r."right", r.days, r.last_day, $10::timestamptz, r.reached_at
  from own, jsonb_to_recordset($12::jsonb) as r(topic text, mean float8, variance float8, answers int, "right" int,
    days int, last_day date, reached_at timestamptz)
  on conflict (user_id, topic) do update set mean = excluded.mean, variance = excluded.variance,
    answers = excluded.answers, "right" = excluded."right", days = excluded.days, last_day = excluded.last_day,
    last_at = excluded.last_at, reached_at = excluded.reached_at`;

const slipCounts = `
), slips as (
  insert into slip_count (user_id, topic, family, slip, times, last_at)
  select own.user_id, r.topic, r.family, r.slip, count(*)::int, $10::timestamptz
  from own, jsonb_to_recordset($13::jsonb) as r(topic text, family text, slip text)
  group by own.user_id, r.topic, r.family, r.slip
  on conflict (user_id, family, slip, topic) do update set times = slip_count.times + excluded.times,
    last_at = excluded.last_at`;

const dayCounts = `
), days as (
  insert into day_count (user_id, day, answered, "right", seconds)
  select own.user_id, $14::date, $15::int, $16::int, $17::int from own where $15::int > 0 or $17::int > 0
  on conflict (user_id, day) do update set answered = day_count.answered + excluded.answered,
    "right" = day_count."right" + excluded."right", seconds = day_count.seconds + excluded.seconds`;

const closing = `
), closing as (
  update problem set closed_at = $10::timestamptz
  from own where problem.user_id = own.user_id and problem.id = $5::uuid and $18::boolean and problem.closed_at is null`;

/**
 * $1 user, $2 expected sequence, $3 $4 ability, $5 problem, $6 family, $7 version, $8 tier, $9 context, $10 moment,
 * $11 answers, $12 topics, $13 slips, $14 day, $15 answered, $16 right, $17 seconds, $18 whether the problem closes.
 * Every branch draws from `own`, which is empty when another answer of the person was recorded since the read.
 * Most answers make no slip and many close no problem: what is not needed is left out, its value only taken note of.
 */
function recordSql(needs: { slips: boolean; closes: boolean }): string {
  const parts = [answersAndLevels, needs.slips ? slipCounts : '', dayCounts, needs.closes ? closing : ''];
  return `${parts.join('')}
)
select count(*)::int as recorded from own where $13::jsonb is not null and $18::boolean is not null`;
}

type Needs = Parameters<typeof recordSql>[0];

function form(needs: Needs): { name: string; text: string } {
  return {
    name: `practice-record${needs.slips ? '-slips' : ''}${needs.closes ? '-closes' : ''}`,
    text: recordSql(needs),
  };
}

const plain = form({ slips: false, closes: false });
const closes = form({ slips: false, closes: true });
const slips = form({ slips: true, closes: false });
const both = form({ slips: true, closes: true });

/** The statement that records what is needed, with the name it is prepared under; each form is made once. */
export function recordForm(needs: Needs): { name: string; text: string } {
  if (needs.slips) return needs.closes ? both : slips;
  return needs.closes ? closes : plain;
}
