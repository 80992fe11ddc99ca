'use client';

import { type ReactNode, useEffect, useId, useRef } from 'react';

interface DialogProps {
  open: boolean;
  /** Esc, or a press beside it. Not called while `busy`. */
  onClose: () => void;
  /** Verb and object: "Override: line 5 ends in T3". */
  title: ReactNode;
  /** What it does and who will see it. */
  lead?: ReactNode;
  children?: ReactNode;
  /** They repeat the verb: `Override and keep the reason`, `Leave it blocked`. */
  actions: ReactNode;
  busy?: boolean;
  /** Makes the whole a form, so that Enter in a field does what the first button says. */
  onSubmit?: (() => void | Promise<unknown>) | undefined;
}

/**
 * Only for what cannot be taken back. The element of the platform holds the focus, gives it back, and needs no style
 * of its own in the page, which a strict content policy would refuse.
 */
export function Dialog({
  open,
  onClose,
  title,
  lead,
  children,
  actions,
  busy = false,
  onSubmit,
}: DialogProps) {
  const element = useRef<HTMLDialogElement>(null);
  const titleId = useId();
  const leadId = useId();

  useEffect(() => {
    const dialog = element.current;
    if (open && dialog && !dialog.open) dialog.showModal();
    if (!open && dialog?.open) dialog.close();
  }, [open]);

  const close = () => {
    if (!busy) onClose();
  };
  const body = (
    <>
      <h2 id={titleId} className="text-[1.3125rem] leading-[1.625rem]">
        {title}
      </h2>
      {lead && (
        <p id={leadId} className="pt-1.5">
          {lead}
        </p>
      )}
      {children && <div className="pt-3">{children}</div>}
      <div className="flex flex-wrap gap-2.5 pt-4">{actions}</div>
    </>
  );

  return (
    <dialog
      ref={element}
      className="lw-dialog"
      aria-labelledby={titleId}
      aria-describedby={lead ? leadId : undefined}
      onCancel={(event) => {
        event.preventDefault();
        close();
      }}
      onClose={() => open && close()}
      onClick={(event) => {
        if (event.target === element.current && isOutside(event, element.current)) close();
      }}
    >
      {open && onSubmit ? (
        <form
          noValidate
          onSubmit={(event) => {
            event.preventDefault();
            void onSubmit();
          }}
        >
          {body}
        </form>
      ) : (
        open && body
      )}
    </dialog>
  );
}

function isOutside({ clientX, clientY }: { clientX: number; clientY: number }, dialog: HTMLElement) {
  const { left, right, top, bottom } = dialog.getBoundingClientRect();
  return clientX < left || clientX > right || clientY < top || clientY > bottom;
}
