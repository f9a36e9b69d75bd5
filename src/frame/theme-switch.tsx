import { chooseTheme, themeChoices, themeNames, useThemeChoice } from '../lib/theme';
import { RadioGroup } from '../ui/radio-group';

/** Sheet, Dim, or as the system has it. */
export function ThemeSwitch({ isInline }: { isInline?: boolean }) {
  const chosen = useThemeChoice();
  return (
    <RadioGroup
      legend="Theme"
      isInline={isInline}
      value={chosen}
      choices={themeChoices.map((value) => ({ value, label: themeNames[value] }))}
      radio={{
        name: 'theme',
        onChange: (event) => {
          const choice = themeChoices.find((value) => value === event.target.value);
          if (choice) chooseTheme(choice);
        },
      }}
    />
  );
}
