import { Link } from 'react-router-dom';
import { roleWords } from '#shared/schemas/role.ts';
import { roleSight } from '#src/features/home/role-sight.ts';
import { keyed } from '#src/lib/keyed.ts';
import { useMe } from '#src/queries/me.ts';

function Lines({ lines }: { lines: string[] }) {
  return (
    <ul className="max-w-[38rem]">
      {lines.map((line) => (
        <li key={line} className="py-2 border-b border-rule-soft first:pt-0 last:border-b-0 last:pb-0">
          {line}
        </li>
      ))}
    </ul>
  );
}

const linesOf = (sights: { will: string[]; willNot: string[] }[], side: 'will' | 'willNot'): string[] => [
  ...new Set(sights.flatMap((sight) => sight[side])),
];

/** For those whose own pages do not exist yet: who they are, what they will see here and what they never will. */
export function Component() {
  const me = useMe();
  const sights = me.memberships.flatMap(({ role }) => roleSight[role] ?? []);
  return (
    <div className="page">
      <title>Home – Plait</title>
      <h1 className="[overflow-wrap:anywhere]">{me.name}</h1>
      <p className="text-ink-2 text-md mt-1.5 mb-7">{me.school.name}</p>
      <section className="mrow" aria-labelledby="roles">
        <h2 className="lab" id="roles">
          Who you are
        </h2>
        {me.memberships.length === 0 ? (
          <p>You have no role at this school at the moment. The school’s Plait admin can give you one.</p>
        ) : (
          <ul>
            {keyed(me.memberships, ({ role, scope }) => `${role} ${scope ?? ''}`).map(({ key, item }) => (
              <li key={key} className="py-2 border-b border-rule-soft first:pt-0 last:border-b-0 last:pb-0">
                <b className="font-semibold">{roleWords[item.role]}</b>
                {item.scope ? (
                  <span className="text-ink-2">
                    {item.role === 'carer' ? ' of ' : ', '}
                    {item.scope}
                  </span>
                ) : null}
              </li>
            ))}
          </ul>
        )}
      </section>
      {sights.length > 0 ? (
        <>
          <section className="mrow" aria-labelledby="will">
            <h2 className="lab" id="will">
              You will see
            </h2>
            <Lines lines={linesOf(sights, 'will')} />
          </section>
          <section className="mrow" aria-labelledby="will-not">
            <h2 className="lab" id="will-not">
              You will not see
            </h2>
            <Lines lines={linesOf(sights, 'willNot')} />
          </section>
        </>
      ) : null}
      <section className="mrow" aria-labelledby="so-far">
        <h2 className="lab" id="so-far">
          So far
        </h2>
        <div>
          <p className="max-w-[38rem]">
            {sights.length > 0 ? 'Those pages are not there yet. ' : null}
            {me.can.manageSchool ? (
              <>
                Under{' '}
                <Link className="link" to="/settings/practice">
                  Settings
                </Link>{' '}
                you choose how many subjects one set mixes.{' '}
              </>
            ) : null}
            {me.can.readEstimates ? (
              <>
                <Link className="link" to="/estimates">
                  Estimates
                </Link>{' '}
                shows how far expected recall can be trusted.{' '}
              </>
            ) : null}
            You can change your password, and choose light or dark colours under your name at the top right. Nothing
            else waits for you here.
          </p>
          <Link className="btn quiet mt-4" to="/password">
            Change password
          </Link>
        </div>
      </section>
    </div>
  );
}
