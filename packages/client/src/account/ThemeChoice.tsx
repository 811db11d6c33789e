import { Segmented } from '@lydite/ui';
import { useState } from 'react';
import { applyTheme, readTheme, type Theme } from '../shell/theme.ts';
import { AccountSection } from './AccountSection.tsx';

const themes: readonly { value: Theme; label: string }[] = [
  { value: 'system', label: 'As the device' },
  { value: 'light', label: 'Light' },
  { value: 'dark', label: 'Dark' },
];

export function ThemeChoice() {
  const [theme, setTheme] = useState(readTheme);
  return (
    <AccountSection title="Light or dark">
      <p className="small mute mt-1 mb-3">Kept on this device. Printing is always light.</p>
      <Segmented
        label="Light or dark"
        value={theme}
        options={themes}
        onChange={(next) => {
          applyTheme(next);
          setTheme(next);
        }}
      />
    </AccountSection>
  );
}
