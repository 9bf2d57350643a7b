import { useEffect, useRef, useState } from 'react';
import { useBlocker } from 'react-router-dom';
import { ConfirmDialog } from '#src/components/dialog.tsx';

interface Saver {
  readonly hasUnsaved: boolean;
  flush: () => Promise<number | null>;
}

interface LeaveGuardProps {
  saver: Saver;
  /** False where a save cannot work now, so that leaving asks at once. */
  canSave: boolean;
}

/** Saves on the way out; where that fails, asks before anything typed is lost. */
export function LeaveGuard({ saver, canSave }: LeaveGuardProps) {
  const [isAsking, setIsAsking] = useState(false);
  const blocker = useBlocker(
    ({ currentLocation, nextLocation }) => saver.hasUnsaved && currentLocation.pathname !== nextLocation.pathname,
  );
  const isHandled = useRef(false);

  useEffect(() => {
    const warn = (event: BeforeUnloadEvent) => {
      if (!saver.hasUnsaved) return;
      void saver.flush();
      event.preventDefault();
    };
    window.addEventListener('beforeunload', warn);
    return () => window.removeEventListener('beforeunload', warn);
  }, [saver]);

  useEffect(() => {
    if (blocker.state !== 'blocked') {
      isHandled.current = false;
      return;
    }
    if (isHandled.current) return;
    isHandled.current = true;
    const settle = async () => {
      if (canSave && (await saver.flush()) !== null) blocker.proceed();
      else setIsAsking(true);
    };
    void settle();
  }, [blocker, saver, canSave]);

  if (!isAsking || blocker.state !== 'blocked') return null;
  const stay = () => {
    setIsAsking(false);
    blocker.reset();
  };
  return (
    <ConfirmDialog
      title="Leave without saving?"
      confirm="Leave"
      cancel="Stay here"
      onConfirm={() => {
        setIsAsking(false);
        blocker.proceed();
      }}
      onClose={stay}
    >
      Your last changes could not be saved. They are lost if you leave this page.
    </ConfirmDialog>
  );
}
