import { ActionIcon, TextInput } from '@mantine/core';
import { IconSearch, IconX } from '@tabler/icons-react';
import { LIMITS } from '@fairlead/shared';
import { useEffect, useRef, useState } from 'react';
import { useWords } from '../hooks/use-words';

interface SearchFieldProps {
  label: string;
  hint: string;
  value: string;
  onSearch: (text: string) => void;
  className?: string;
}

/** Between the last key and the request. */
const PAUSE_MILLISECONDS = 250;

/** What is typed shows at once; the list follows when the typing rests. */
export function SearchField({ label, hint, value, onSearch, className }: SearchFieldProps) {
  const { say } = useWords();
  const [text, setText] = useState(value);
  const sent = useRef(value);

  // Back, forward and "clear" change the URL, not the field.
  useEffect(() => {
    if (value !== sent.current) setText(value);
    sent.current = value;
  }, [value]);

  useEffect(() => {
    if (text === sent.current) return;
    const timer = setTimeout(() => {
      sent.current = text;
      onSearch(text);
    }, PAUSE_MILLISECONDS);
    return () => clearTimeout(timer);
  }, [text, onSearch]);

  return (
    <TextInput
      type="search"
      className={className}
      aria-label={label}
      placeholder={hint}
      maxLength={LIMITS.search}
      leftSection={<IconSearch size={18} aria-hidden />}
      rightSection={
        text !== '' && (
          <ActionIcon aria-label={say('app.clearSearch')} onClick={() => setText('')}>
            <IconX size={18} />
          </ActionIcon>
        )
      }
      value={text}
      onChange={(event) => setText(event.currentTarget.value)}
      onKeyDown={(event) => event.key === 'Escape' && text !== '' && setText('')}
    />
  );
}
