import { NativeSelect } from '@mantine/core';
import type { ListParams } from '../hooks/use-list-params';
import classes from './list-controls.module.css';
import { SearchField } from './search-field';

interface Choice {
  value: string;
  label: string;
}

interface ListControlsProps {
  values: ListParams;
  onChange: (change: Partial<ListParams>) => void;
  search: { label: string; hint: string };
  filter: { label: string; choices: Choice[] };
  sort: { label: string; choices: Choice[] };
}

/** What narrows and orders a list; all of it stands in the URL. */
export function ListControls({ values, onChange, search, filter, sort }: ListControlsProps) {
  return (
    <div className={classes.controls}>
      <SearchField
        className={classes.search}
        label={search.label}
        hint={search.hint}
        value={values.search}
        onSearch={(text) => onChange({ search: text })}
      />
      <NativeSelect
        aria-label={filter.label}
        data={filter.choices}
        value={values.status}
        onChange={(event) => onChange({ status: event.currentTarget.value })}
      />
      <NativeSelect
        aria-label={sort.label}
        data={sort.choices}
        value={values.sort}
        onChange={(event) => onChange({ sort: event.currentTarget.value })}
      />
    </div>
  );
}
