import { statusMarks } from '@fairlead/shared';
import type { Status } from '@fairlead/shared';
import { DisplayListSvg } from './display-list-svg';
import classes from './drawing.module.css';

/** The shape of a status. Decorative: the word stands beside it. */
export function StatusGlyph({ status, size = 20 }: { status: Status; size?: number }) {
  const list = { width: size, height: size, marks: statusMarks(status, size / 2, size / 2, size) };
  return <DisplayListSvg list={list} className={classes.glyph} />;
}
