import { chooseTheme, useThemeChoice, type ThemeChoice } from '@/theme/use-theme';
import styles from './theme-switch.module.css';

const choices: [ThemeChoice, string][] = [
  ['day', 'Day'],
  ['night', 'Night'],
  ['auto', 'Auto'],
];

/** Day, night, or as the system says. */
export function ThemeSwitch() {
  const chosen = useThemeChoice();
  return (
    <fieldset className={styles.switch}>
      <legend className="visually-hidden">Light of the screen</legend>
      {choices.map(([choice, label]) => (
        <label key={choice} className={styles.choice}>
          <input
            type="radio"
            name="theme"
            className={styles.radio}
            checked={chosen === choice}
            onChange={() => chooseTheme(choice)}
          />
          <span>{label}</span>
        </label>
      ))}
    </fieldset>
  );
}
