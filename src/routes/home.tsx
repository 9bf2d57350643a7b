import { roleWords } from '#shared/schemas/role.ts';
import { keyed } from '#src/lib/keyed.ts';
import { useMe } from '#src/queries/me.ts';

/** For those whose own pages do not exist yet: who they are, and what they can see so far. */
export function Component() {
  const me = useMe();
  return (
    <div className="page">
      <title>Home – Plait</title>
      <h1>{me.name}</h1>
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
              <li key={key} className="py-2 border-b border-rule-soft last:border-b-0">
                <b className="font-semibold">{roleWords[item.role]}</b>
                {item.scope ? <span className="text-ink-2">, {item.scope}</span> : null}
              </li>
            ))}
          </ul>
        )}
      </section>
      <section className="mrow" aria-labelledby="so-far">
        <h2 className="lab" id="so-far">
          What you can see
        </h2>
        <p className="max-w-[36rem]">
          So far this page only. The pages for your role are still being built; nothing is waiting for you, and nothing
          is lost by coming back later.
        </p>
      </section>
    </div>
  );
}
