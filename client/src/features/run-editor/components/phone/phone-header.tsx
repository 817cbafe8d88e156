import { Menu } from '@mantine/core';
import { IconChevronLeft, IconDots } from '@tabler/icons-react';
import { Link } from 'react-router-dom';
import { useWords } from '../../../../hooks/use-words';
import { chooseTheme, THEME_CHOICES } from '../../../../lib/device';
import { paths } from '../../../../lib/paths';
import { useRunEditor } from '../../state/use-run-editor';
import { useCommands, useIsEnabled } from '../commands/commands-context';
import type { DialogName } from '../dialogs/dialog-name';
import { SavingLine } from '../header/saving-line';
import { wordRaceway } from '../model/word-piece';
import { wordRules } from '../model/word-rules';
import classes from './phone.module.css';

export function PhoneHeader({ onOpen }: { onOpen: (dialog: DialogName) => void }) {
  const { say } = useWords();
  const document = useRunEditor((state) => state.document);
  const assumed = useRunEditor((state) => state.analysis.assumed);
  const { job, jobId, revision } = useRunEditor((state) => state.server);
  const { doCommand } = useCommands();
  const needsYou = useRunEditor((state) => state.saving.state === 'needs-you');
  const saving = <SavingLine onNeedsYou={() => onOpen('saving')} />;
  const canRedo = useIsEnabled('redo');
  return (
    <header className={classes.header}>
      <Link
        to={paths.job(jobId)}
        className={classes.icon}
        aria-label={say('workbench.back', { job: job.name })}
      >
        <IconChevronLeft size={26} aria-hidden />
      </Link>
      <div className={classes.name}>
        <h1 className={classes.tag}>{document.tag}</h1>
        <div className={classes.sub}>
          <span>
            {say('workbench.revision', {
              letter: revision.letter,
              state: say(`workbench.state.${revision.state}`),
            })}
          </span>
          {!needsYou && saving}
        </div>
      </div>
      {needsYou && saving}
      <Menu position="bottom-end" width={280}>
        <Menu.Target>
          <button type="button" className={classes.icon} aria-label={say('workbench.more')}>
            <IconDots size={26} aria-hidden />
          </button>
        </Menu.Target>
        <Menu.Dropdown>
          <Menu.Item disabled={!canRedo} onClick={() => doCommand('redo')}>
            {say('workbench.redo')}
          </Menu.Item>
          <Menu.Item onClick={() => onOpen('identity')}>{say('workbench.rename.title')}</Menu.Item>
          <Menu.Item onClick={() => onOpen('raceway')}>
            {wordRaceway(document.raceway, say)}
          </Menu.Item>
          <Menu.Item onClick={() => onOpen('rules')}>{wordRules(document, assumed, say)}</Menu.Item>
          <Menu.Divider />
          {THEME_CHOICES.map((choice) => (
            <Menu.Item key={choice} onClick={() => chooseTheme(choice)}>
              {say(`app.theme.${choice}`)}
            </Menu.Item>
          ))}
        </Menu.Dropdown>
      </Menu>
    </header>
  );
}
