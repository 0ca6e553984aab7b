import { useState, type ReactNode } from 'react';
import { Checkbox } from '../../../components/ui/Checkbox';
import { RadioTiles } from '../../../components/ui/Tiles';
import { isSoundOn, playScanTone, setSoundOn, unlockSounds } from '../../../lib/sounds';
import { readThemeChoice, setThemeChoice, type ThemeChoice } from '../../../lib/theme';

const THEMES: readonly { value: ThemeChoice; label: string; hint: string }[] = [
  { value: 'system', label: 'As the device', hint: 'Follows its own setting' },
  { value: 'light', label: 'Light', hint: 'For the yard and the counter' },
  { value: 'dark', label: 'Dark', hint: 'For a dim cage' },
];

/** What is kept on this device only. */
export function DeviceSettings(): ReactNode {
  const [theme, setTheme] = useState(readThemeChoice);
  const [hasSound, setSound] = useState(isSoundOn);
  return (
    <div className="flex flex-col gap-4">
      <RadioTiles
        legend="Colours"
        columns={3}
        options={THEMES}
        selected={[theme]}
        input={{
          name: 'theme',
          onChange: (event) => {
            const choice = THEMES.find(({ value }) => value === event.target.value)?.value ?? 'system';
            setThemeChoice(choice);
            setTheme(choice);
          },
        }}
      />
      <Checkbox
        label="Sound and vibration when a label is scanned"
        hint="Two rising notes: use. Two low buzzes: do not use."
        checked={hasSound}
        onChange={(event) => {
          setSoundOn(event.target.checked);
          setSound(event.target.checked);
          if (!event.target.checked) return;
          unlockSounds();
          playScanTone('use');
        }}
      />
    </div>
  );
}
