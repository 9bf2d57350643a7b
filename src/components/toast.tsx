import { createContext, type ReactNode, useCallback, useContext, useEffect, useMemo, useState } from 'react';

interface Toast {
  message: string;
  action?: { label: string; run: () => void };
}

const ToastContext = createContext<((toast: Toast) => void) | null>(null);

/** How long a toast stays; reading or pointing at it holds it. */
const SHOWN_MS = 6000;

/** One toast at a time, bottom left. Put it round the routes, inside the query provider. */
export function ToastProvider({ children }: { children: ReactNode }) {
  const [shown, setShown] = useState<(Toast & { id: number }) | null>(null);
  const [isHeld, setIsHeld] = useState(false);
  const show = useCallback((toast: Toast) => setShown((last) => ({ ...toast, id: (last?.id ?? 0) + 1 })), []);
  const close = useCallback(() => {
    setShown(null);
    setIsHeld(false);
  }, []);
  const id = shown?.id;
  useEffect(() => {
    if (id === undefined || isHeld) return;
    const timer = setTimeout(close, SHOWN_MS);
    return () => clearTimeout(timer);
  }, [id, isHeld, close]);
  const { action, message } = shown ?? {};
  return (
    <ToastContext value={show}>
      {children}
      <div
        role="status"
        className="fixed bottom-20 left-5 z-30 max-w-[calc(100vw-2.5rem)] md:bottom-6 md:left-10 print:hidden"
        onPointerEnter={() => setIsHeld(true)}
        onPointerLeave={() => setIsHeld(false)}
        onFocus={() => setIsHeld(true)}
        onBlur={() => setIsHeld(false)}
      >
        {message ? (
          <div className="flex items-center gap-5 rounded bg-ink px-4 py-3 text-ground shadow-lift">
            <span>{message}</span>
            {action ? (
              <button
                type="button"
                className="-my-3 min-h-11 font-semibold underline underline-offset-4 focus-visible:outline-ground"
                onClick={() => {
                  action.run();
                  close();
                }}
              >
                {action.label}
              </button>
            ) : null}
          </div>
        ) : null}
      </div>
    </ToastContext>
  );
}

/** Says one short thing at the bottom of the page, with one step to take it back where there is one. */
export function useToast() {
  const show = useContext(ToastContext);
  if (!show) throw new Error('useToast stands outside ToastProvider.');
  return useMemo(
    () => (message: string, action?: Toast['action']) => show(action ? { message, action } : { message }),
    [show],
  );
}
