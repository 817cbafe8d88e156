import { Modal } from '@mantine/core';
import type { ReactNode } from 'react';
import { useWords } from '../hooks/use-words';
import classes from './dialog-frame.module.css';

interface Props {
  isOpen: boolean;
  title: string;
  size: 'md' | 'lg' | 'xl';
  /** Absent: a choice has to be made, and neither Esc nor a click beside it closes the dialog. */
  onClose?: () => void;
  children: ReactNode;
}

/** How every dialog looks. Its head is no page banner, so it is no header element. */
export function DialogFrame({ isOpen, title, size, onClose, children }: Props) {
  const { say } = useWords();
  return (
    <Modal.Root
      opened={isOpen}
      onClose={onClose ?? (() => undefined)}
      size={size}
      classNames={{ content: classes.content }}
      centered
      closeOnEscape={onClose !== undefined}
      closeOnClickOutside={onClose !== undefined}
    >
      <Modal.Overlay />
      <Modal.Content>
        <div className={classes.head}>
          <Modal.Title className={classes.title}>{title}</Modal.Title>
          {onClose && <Modal.CloseButton aria-label={say('app.close')} />}
        </div>
        <Modal.Body>{children}</Modal.Body>
      </Modal.Content>
    </Modal.Root>
  );
}
