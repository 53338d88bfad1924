import { Radio } from 'antd';
import { useTheme, type ThemeChoice } from '../../components/useTokens';

const CHOICES: { value: ThemeChoice; label: string }[] = [
  { value: 'system', label: 'As the system' },
  { value: 'light', label: 'Light' },
  { value: 'dark', label: 'Dark' },
];

export function ThemeChooser() {
  const { choice, choose } = useTheme();
  return (
    <Radio.Group
      aria-label="Theme"
      options={CHOICES}
      value={choice}
      onChange={(event) => choose(event.target.value as ThemeChoice)}
    />
  );
}
