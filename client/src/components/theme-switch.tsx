import { ActionIcon, Menu } from '@mantine/core';
import { IconCheck, IconDeviceLaptop, IconMoon, IconSun, IconSunHigh } from '@tabler/icons-react';
import { useTheme } from '../hooks/use-theme';
import { useWords } from '../hooks/use-words';
import { chooseTheme, THEME_CHOICES } from '../lib/device';

const ICONS = { system: IconDeviceLaptop, light: IconSun, dark: IconMoon, sun: IconSunHigh };

/** Light, dark, the device's own, or sun for reading outdoors. */
export function ThemeSwitch() {
  const { say } = useWords();
  const { choice } = useTheme();
  const Current = ICONS[choice];
  return (
    <Menu position="bottom-end">
      <Menu.Target>
        <ActionIcon
          aria-label={say('app.theme.now', { theme: say(`app.theme.${choice}`) })}
          size="lg"
        >
          <Current size={20} />
        </ActionIcon>
      </Menu.Target>
      <Menu.Dropdown>
        {THEME_CHOICES.map((option) => {
          const Icon = ICONS[option];
          return (
            <Menu.Item
              key={option}
              role="menuitemradio"
              aria-checked={option === choice}
              leftSection={<Icon size={18} />}
              rightSection={option === choice ? <IconCheck size={18} /> : undefined}
              onClick={() => chooseTheme(option)}
            >
              {say(`app.theme.${option}`)}
            </Menu.Item>
          );
        })}
      </Menu.Dropdown>
    </Menu>
  );
}
