import { useState } from 'react';
import type { ReactNode, UIEvent } from 'react';
import type { Place } from './commands/commands';
import { useCommands } from './commands/commands-context';
import { ConductorsTab } from './conductors/conductors-tab';
import type { DialogName } from './dialogs/dialog-name';
import { WorkbenchHeader } from './header/workbench-header';
import { WorkbenchTabs } from './header/workbench-tabs';
import { useGoToPiece } from './hooks/use-go-to-piece';
import { AddRow } from './list/add-row';
import listClasses from './list/list.module.css';
import { PieceList } from './list/piece-list';
import { PanelBoundary } from './panel-boundary';
import { PullTab } from './pull/pull-tab';
import { SelectedPiece } from './rail/selected-piece';
import { SketchPanel } from './rail/sketch-panel';
import { ToFix } from './rail/to-fix';
import { StripPanel } from './strip/strip-panel';
import { VerdictRow } from './verdicts/verdict-row';
import classes from './workbench.module.css';

interface Props {
  place: Place;
  onOpen: (dialog: DialogName) => void;
}

/** px the list gains when the strip shrinks, and a little more, so that it can still be scrolled then. */
const ROOM_TO_SHRINK = 220;

const PARTS: Record<Place, ReactNode> = {
  layout: <Layout />,
  conductors: <ConductorsTab />,
  pull: <PullTab />,
};

/** The run editor at a desk. */
export function DeskWorkbench({ place, onOpen }: Props) {
  const { goTo } = useCommands();
  const goToPiece = useGoToPiece(goTo);
  return (
    <div className={classes.desk}>
      <WorkbenchHeader onOpen={onOpen} />
      <main className={classes.deskPart}>
        <WorkbenchTabs place={place} onOpen={onOpen} />
        <div
          id="workbench-panel"
          className={classes.deskBody}
          role="tabpanel"
          aria-labelledby={`tab-${place}`}
        >
          <div className={classes.deskWide}>
            <PanelBoundary>
              <VerdictRow onGo={goToPiece} />
            </PanelBoundary>
          </div>
          <div className={classes.deskMain}>{PARTS[place]}</div>
          <div className={classes.rail}>
            <PanelBoundary>
              <ToFix onGo={goToPiece} />
            </PanelBoundary>
            {place === 'layout' && (
              <>
                <PanelBoundary>
                  <SelectedPiece />
                </PanelBoundary>
                <PanelBoundary>
                  <SketchPanel />
                </PanelBoundary>
              </>
            )}
          </div>
        </div>
      </main>
    </div>
  );
}

function Layout() {
  const [isShrunk, setShrunk] = useState(false);
  const onScroll = ({ currentTarget: list }: UIEvent<HTMLDivElement>) => {
    if (list.scrollTop === 0) setShrunk(false);
    else if (list.scrollHeight - list.clientHeight > ROOM_TO_SHRINK) setShrunk(true);
  };
  return (
    <>
      <StripPanel variant={isShrunk ? 'compact-height' : 'desk'} />
      <div className={listClasses.panel}>
        <PanelBoundary>
          <PieceList onScroll={onScroll} />
        </PanelBoundary>
        <AddRow />
      </div>
    </>
  );
}
