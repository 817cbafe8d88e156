import { IconChevronLeft } from '@tabler/icons-react';
import { useEffect, useRef } from 'react';
import type { ReactNode } from 'react';
import { useWords } from '../../../../hooks/use-words';
import classes from './phone.module.css';

interface Props {
  title: string;
  onClose: () => void;
  children: ReactNode;
}

/** Takes the place of the list, under the drawing that stays in sight. Esc closes it and nothing else. */
export function PhoneSheet({ title, onClose, children }: Props) {
  const { say } = useWords();
  const heading = useRef<HTMLHeadingElement>(null);
  useEffect(() => heading.current?.focus(), []);
  return (
    <section
      aria-label={title}
      onKeyDown={(event) => {
        if (event.key !== 'Escape' || event.defaultPrevented) return;
        event.stopPropagation();
        onClose();
      }}
    >
      <div className={classes.sheetHead}>
        <button
          type="button"
          className={classes.icon}
          aria-label={say('workbench.selected.toList')}
          onClick={onClose}
        >
          <IconChevronLeft size={26} aria-hidden />
        </button>
        <h2 ref={heading} tabIndex={-1}>
          {title}
        </h2>
      </div>
      <div className={classes.sheet}>{children}</div>
    </section>
  );
}
