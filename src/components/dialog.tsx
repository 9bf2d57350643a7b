import { type ReactNode, useId, useLayoutEffect, useRef } from 'react';

interface DialogProps {
  /** A question, or what the dialog is for. */
  title: string;
  children: ReactNode;
  onClose: () => void;
  isWide?: boolean;
}

/**
 * A modal on the native element: focus stays inside, Escape closes, focus returns to what opened it.
 * Render it while it is open and leave it out otherwise.
 */
export function Dialog({ title, children, onClose, isWide = false }: DialogProps) {
  const element = useRef<HTMLDialogElement>(null);
  const titleId = useId();
  useLayoutEffect(() => {
    const dialog = element.current;
    dialog?.showModal();
    // Closing before the node leaves the page is what makes the browser give the focus back.
    return () => dialog?.close();
  }, []);
  return (
    <dialog
      ref={element}
      aria-labelledby={titleId}
      onCancel={(event) => {
        event.preventDefault();
        onClose();
      }}
      className={`m-auto w-[calc(100%-2rem)] max-h-[calc(100dvh-2rem)] overflow-y-auto rounded-lg border border-rule bg-raise p-5 text-ink shadow-lift backdrop:bg-[rgb(10_14_22/.5)] sm:p-7 ${isWide ? 'max-w-[44rem]' : 'max-w-[28rem]'}`}
    >
      <h2 id={titleId} className="!text-[1.375rem] !leading-7">
        {title}
      </h2>
      {children}
    </dialog>
  );
}

interface ConfirmDialogProps {
  /** A question: "Retire this question?" */
  title: string;
  children: ReactNode;
  /** Names the act, verb first. */
  confirm: string;
  /** Names the way back. */
  cancel: string;
  isBusy?: boolean;
  error?: string | undefined;
  onConfirm: () => void;
  onClose: () => void;
}

/** A question with two named buttons. */
export function ConfirmDialog(props: ConfirmDialogProps) {
  const { title, children, confirm, cancel, isBusy = false, error, onConfirm, onClose } = props;
  return (
    <Dialog title={title} onClose={onClose}>
      <div className="mt-1.5 mb-5 text-ink-2">{children}</div>
      {error ? (
        <p role="alert" className="err mb-4">
          {error}
        </p>
      ) : null}
      <div className="flex flex-wrap gap-2">
        <button type="button" className="btn" disabled={isBusy} onClick={onConfirm}>
          {confirm}
        </button>
        <button type="button" className="btn quiet" onClick={onClose}>
          {cancel}
        </button>
      </div>
    </Dialog>
  );
}
