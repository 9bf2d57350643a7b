import { useState } from 'react';
import { Link, useNavigate } from 'react-router-dom';
import { ConfirmDialog } from '#src/components/dialog.tsx';
import { Segmented } from '#src/components/segmented.tsx';
import { hideTime, isTimeHidden } from '#src/lib/hidden-time.ts';
import { kept } from '#src/lib/kept.ts';
import { queryClient } from '#src/lib/query-client.ts';
import { problemWords } from '#src/lib/show-problem.ts';
import { chooseTheme, chosenTheme, type ThemeChoice } from '#src/lib/theme.ts';
import { countUnsent } from '#src/lib/unsent.ts';
import { useMe } from '#src/queries/me.ts';
import { useSignOut } from '#src/queries/session.ts';

const themes = [
  { value: 'system', label: 'As the device' },
  { value: 'light', label: 'Light' },
  { value: 'dark', label: 'Dark' },
] as const satisfies { value: ThemeChoice; label: string }[];

function ThemeSetting() {
  const [theme, setTheme] = useState(chosenTheme);
  return (
    <Segmented
      label="Colours"
      options={themes}
      value={theme}
      onChange={(choice) => {
        chooseTheme(choice);
        setTheme(choice);
      }}
    />
  );
}

function useLeave() {
  const me = useMe();
  const navigate = useNavigate();
  const signOut = useSignOut();
  const [isAsking, setIsAsking] = useState(false);
  const leave = () => {
    // Signing out clears this site's storage; how the page looks is worth keeping.
    const theme = chosenTheme();
    const isHidden = isTimeHidden();
    signOut.mutate(undefined, {
      onSuccess: async () => {
        chooseTheme(theme);
        hideTime(isHidden);
        // At once, because a page still drawn would ask again for what is cleared.
        await navigate(`/sign-in/${me.school.code}`, { flushSync: true });
        queryClient.clear();
      },
    });
  };
  const ask = async () => {
    // Other tabs of the same device may have kept answers since.
    await kept.refresh(me.id);
    if (countUnsent(me.id) > 0) setIsAsking(true);
    else leave();
  };
  return { isAsking, setIsAsking, leave, unsent: countUnsent(me.id), signOut, ask: () => void ask() };
}

interface NamePanelProps {
  /** Called when a choice leads to another page. */
  onClose: () => void;
}

/** What opens under the name: password, colours, sign out. Loaded when it is first wanted. */
export function NamePanel({ onClose }: NamePanelProps) {
  const me = useMe();
  const { isAsking, setIsAsking, leave, unsent, signOut, ask } = useLeave();
  return (
    <>
      <p className="font-semibold [overflow-wrap:anywhere]">{me.name}</p>
      <p className="hint [overflow-wrap:anywhere]">
        {me.username}, {me.school.name}
      </p>
      <p className="mt-4 mb-1.5 text-sm font-semibold" aria-hidden="true">
        Colours
      </p>
      <ThemeSetting />
      <div className="mt-4 grid justify-items-start border-t border-rule pt-2">
        <Link className="link inline-flex items-center min-h-11" to="/password" onClick={onClose}>
          Change password
        </Link>
        <button type="button" className="link min-h-11" disabled={signOut.isPending} onClick={ask}>
          Sign out
        </button>
      </div>
      {signOut.isError ? (
        <p role="alert" className="err mt-1">
          {problemWords(signOut.error)}
        </p>
      ) : null}
      {isAsking ? (
        <ConfirmDialog
          title="Sign out and lose what is not sent?"
          confirm="Sign out"
          cancel="Stay signed in"
          isBusy={signOut.isPending}
          error={signOut.isError ? problemWords(signOut.error) : undefined}
          onConfirm={leave}
          onClose={() => setIsAsking(false)}
        >
          {unsent === 1 ? 'One answer is' : `${unsent} answers are`} kept here and not sent yet. Signing out removes{' '}
          {unsent === 1 ? 'it' : 'them'}.
        </ConfirmDialog>
      ) : null}
    </>
  );
}
