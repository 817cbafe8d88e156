import { createContext, useMemo, useRef, useState } from 'react';
import type { ReactNode } from 'react';
import type { LengthFieldProps } from '../fields/length-reading';

export interface KeypadControl {
  /** The field the keys type into. */
  activeKey: string | null;
  fieldOf: (fieldKey: string) => LengthFieldProps | null;
  register: (field: LengthFieldProps) => void;
  forget: (fieldKey: string) => void;
  open: (fieldKey: string) => void;
  /** Moves on to the next length on the screen, in the order they stand. */
  next: () => void;
  close: () => void;
}

/** null where lengths are typed on a keyboard. */
export const KeypadContext = createContext<KeypadControl | null>(null);

/** The lengths on the screen, in the order they stand; they stay in the page while the keys are open. */
function keysInOrder(): string[] {
  const fields = document.querySelectorAll<HTMLElement>('[data-length-field]');
  return Array.from(fields).flatMap(({ dataset }) => dataset.lengthField ?? []);
}

export function KeypadProvider({ isOn, children }: { isOn: boolean; children: ReactNode }) {
  const [activeKey, setActiveKey] = useState<string | null>(null);
  const fields = useRef(new Map<string, LengthFieldProps>());
  const control = useMemo<KeypadControl>(
    () => ({
      activeKey,
      fieldOf: (fieldKey) => fields.current.get(fieldKey) ?? null,
      register: (field) => void fields.current.set(field.fieldKey, field),
      forget: (fieldKey) => void fields.current.delete(fieldKey),
      open: setActiveKey,
      next: () => {
        const keys = keysInOrder();
        const place = activeKey === null ? -1 : keys.indexOf(activeKey);
        setActiveKey(keys[(place + 1) % keys.length] ?? null);
      },
      close: () => {
        setActiveKey(null);
        const button = activeKey && `[data-length-field="${CSS.escape(activeKey)}"]`;
        // The field comes back into view only after the keys have gone.
        setTimeout(() => button && document.querySelector<HTMLElement>(button)?.focus());
      },
    }),
    [activeKey],
  );
  return <KeypadContext.Provider value={isOn ? control : null}>{children}</KeypadContext.Provider>;
}
