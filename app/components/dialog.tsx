// A paper sheet with an ink edge, on the browser's own <dialog>: focus, Esc and the rest of the page are its business.
import { type ReactNode, useEffect, useId, useRef } from "react";
import { classNames } from "./class-names";
import { Icon } from "./icon";

export interface DialogProps {
  isOpen: boolean;
  onClose: () => void;
  /** Where something is asked, the question itself. */
  title: ReactNode;
  children?: ReactNode;
  /** The answers. */
  actions?: ReactNode;
  wide?: boolean;
}

export function Dialog({ isOpen, onClose, title, children, actions, wide }: DialogProps) {
  const ref = useRef<HTMLDialogElement>(null);
  const id = useId();
  useEffect(() => {
    const dialog = ref.current;
    if (!dialog) return;
    if (isOpen && !dialog.open) dialog.showModal();
    if (!isOpen && dialog.open) dialog.close();
  }, [isOpen]);
  return (
    <dialog
      ref={ref}
      aria-labelledby={`${id}-title`}
      onClose={onClose}
      onClick={(event) => event.target === ref.current && onClose()}
      className={classNames("m-auto w-[calc(100%-32px)] border-2 border-ink bg-paper p-0 text-ink", wide ? "max-w-3xl" : "max-w-lg")}
    >
      {isOpen && (
        <div className="relative p-5 md:p-6">
          <h2 id={`${id}-title`} className="pb-3 pr-10 text-finding font-bold">
            {title}
          </h2>
          {children}
          {actions && <div className="flex flex-wrap items-center gap-3 pt-5">{actions}</div>}
          {/* Last in order, so that the focus begins with the question's own answers. */}
          <button type="button" onClick={onClose} className="absolute right-2 top-2 inline-flex size-11 items-center justify-center hover:text-live" aria-label="Close">
            <Icon name="cross" />
          </button>
        </div>
      )}
    </dialog>
  );
}
