import { useMediaQuery } from '@mantine/hooks';
import { useContext } from 'react';
import { useTheme } from '../../../../hooks/use-theme';
import type { Place } from '../commands/commands';
import { useCommands } from '../commands/commands-context';
import { ConductorsTab } from '../conductors/conductors-tab';
import type { DialogName } from '../dialogs/dialog-name';
import { KeypadContext, KeypadProvider } from '../keypad/keypad-context';
import { LengthKeypad } from '../keypad/length-keypad';
import { PanelBoundary } from '../panel-boundary';
import { StripPanel } from '../strip/strip-panel';
import { WorstVerdict } from '../verdicts/worst-verdict';
import { PullTab } from '../pull/pull-tab';
import { Ledger } from './ledger';
import classes from './phone.module.css';
import { PhoneActs } from './phone-acts';
import { PhoneHeader } from './phone-header';
import { PhoneMiddle } from './phone-middle';
import { PhoneStepper } from './phone-stepper';
import { PhoneTabs } from './phone-tabs';
import type { PhoneView } from './phone-view';

/** On a low screen the list keeps its room and the drawing gives some up. */
const LOW = '(max-height: 759px)';

interface Props {
  place: Place;
  view: PhoneView;
  onView: (view: PhoneView) => void;
  onOpen: (dialog: DialogName) => void;
}

/** The run editor in a hand: what must be seen stands still, only the middle changes. */
export function PhoneWorkbench(props: Props) {
  const { density } = useTheme();
  return (
    <KeypadProvider isOn={density === 'field'}>
      <PhoneFrame {...props} />
    </KeypadProvider>
  );
}

/** While the length keys are open: a low drawing, the ledger, one field and the keys, nothing else. */
function PhoneFrame({ place, view, onView, onOpen }: Props) {
  const { goTo } = useCommands();
  const isTyping = Boolean(useContext(KeypadContext)?.activeKey);
  const isLayout = place === 'layout';
  // A sheet takes the room the drawing gives up; the piece line stays where pieces are walked.
  const isSheet = view === 'piece' || view === 'fix' || view === 'add';
  const isLow = useMediaQuery(LOW, false, { getInitialValueInEffect: false });
  const isCompact = isTyping || isSheet || isLow;
  const hasStepper = isLayout && (!isSheet || view === 'piece');
  const openToFix = () => {
    goTo('layout');
    onView('fix');
  };
  return (
    <div className={classes.phone}>
      {!isTyping && <PhoneHeader onOpen={onOpen} />}
      <main className={classes.part}>
        {!isTyping && <WorstVerdict onOpen={openToFix} />}
        {(isLayout || isTyping) && (
          <StripPanel variant={isCompact ? 'compact-height' : 'phone'} isPhone hasPulls={false} />
        )}
        {hasStepper && !isTyping && <PhoneStepper onOpen={() => onView('piece')} />}
        {isTyping && <Ledger />}
        <div
          id="workbench-panel"
          className={classes.body}
          role="tabpanel"
          aria-labelledby={`tab-${place}`}
          hidden={isTyping}
        >
          <PanelBoundary>
            {isLayout && <PhoneMiddle view={view} onView={onView} />}
            {place === 'conductors' && <ConductorsTab />}
            {place === 'pull' && (
              <>
                <StripPanel variant="phone" isPhone />
                <PullTab />
              </>
            )}
          </PanelBoundary>
        </div>
        {isTyping && <div className={classes.body} />}
        {isTyping && <LengthKeypad />}
        {!isTyping && isLayout && <Ledger />}
        {!isTyping && isLayout && <PhoneActs view={view} onView={onView} />}
        {!isTyping && <PhoneTabs place={place} />}
      </main>
    </div>
  );
}
