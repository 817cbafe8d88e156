import type { DisplayList } from '@fairlead/shared';
import { IconChevronLeft, IconChevronRight } from '@tabler/icons-react';
import { useWords } from '../../hooks/use-words';
import { DisplayListSvg } from './display-list-svg';
import classes from './drawing.module.css';

interface Props {
  list: DisplayList;
  sections: readonly { from: number; to: number }[];
  bodyWidth: number;
  /** How much of the body is seen, px. */
  view: number;
  scrolled: number;
  gutter: number;
  onScrollTo: (left: number) => void;
}

const MARGIN = 24;

/**
 * The whole run in one line under a strip that scrolls, with the part that is seen framed. The keys walk the strip
 * itself, so nothing here is a tab stop.
 */
export function StripOverview(props: Props) {
  const { list, sections, bodyWidth, view, scrolled, gutter, onScrollTo } = props;
  const { say } = useWords();
  const share = list.width / bodyWidth;
  const starts = sections.map(({ from }) => Math.min(Math.max(0, from - MARGIN), bodyWidth - view));
  const before = starts.filter((start) => start < scrolled - 1).at(-1);
  const after = starts.find((start) => start > scrolled + 1);
  return (
    <div className={classes.overview} style={{ paddingLeft: gutter }}>
      <div
        className={classes.whole}
        role="presentation"
        onClick={(event) => {
          const x = event.clientX - event.currentTarget.getBoundingClientRect().left;
          onScrollTo(x / share - view / 2);
        }}
      >
        <DisplayListSvg list={list} />
        <span
          className={classes.seen}
          style={{ left: scrolled * share, width: Math.min(list.width, view * share) }}
        />
      </div>
      <button
        type="button"
        className={classes.section}
        tabIndex={-1}
        aria-label={say('strip.earlierSection')}
        disabled={before === undefined}
        onClick={() => before !== undefined && onScrollTo(before)}
      >
        <IconChevronLeft aria-hidden="true" />
      </button>
      <button
        type="button"
        className={classes.section}
        tabIndex={-1}
        aria-label={say('strip.laterSection')}
        disabled={after === undefined}
        onClick={() => after !== undefined && onScrollTo(after)}
      >
        <IconChevronRight aria-hidden="true" />
      </button>
    </div>
  );
}
