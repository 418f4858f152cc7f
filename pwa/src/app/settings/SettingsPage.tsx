import { ChoiceChips } from '../../design/choice/ChoiceChips';
import { ToggleField } from '../../design/form/ToggleField';
import { Section } from '../../design/layout/Section';
import { PageFrame } from '../../design/page/PageFrame';
import { setTheme, useThemeChoice, type ThemeChoice } from '../../design/theme/theme';
import { setHand, useHand } from '../../platform/hand';
import { paths } from '../../platform/paths';
import { InstallSection } from './InstallSection';
import { OfflineSection } from './OfflineSection';

const LOOKS: readonly { value: ThemeChoice; label: string }[] = [
  { value: 'system', label: 'Device' },
  { value: 'day', label: 'Day' },
  { value: 'dusk', label: 'Dusk' },
  { value: 'red-night', label: 'Red night' },
];

/** The look and the habits of this phone, and what it holds without signal. */
export function SettingsPage() {
  const choice = useThemeChoice();
  const hand = useHand();
  return (
    <PageFrame
      title="Settings"
      subtitle="Of this device; never sent"
      back={{ to: paths.account(), label: 'Account' }}
    >
      <Section title="Look">
        <ChoiceChips
          label="Theme"
          hideLabel
          options={LOOKS}
          value={choice}
          onChange={(value) => setTheme(value ?? 'system')}
        />
        <p className="soft small">
          Device follows its light or dark setting. Red night shows nothing but red, so that eyes stay used to
          the dark.
        </p>
      </Section>
      <Section title="In the field">
        <ToggleField
          label="Left hand"
          hint="Mirrors the rows and the score pad."
          value={hand === 'left'}
          onChange={(isLeft) => setHand(isLeft ? 'left' : 'right')}
        />
      </Section>
      <OfflineSection />
      <InstallSection />
    </PageFrame>
  );
}
