import { useSyncExternalStore } from 'react';
import type { PreferenceName } from '../lib/preferences';
import { keepPreference, onPreferenceChange, readPreference } from '../lib/preferences';

/**
 * A choice this device remembers, the same in every tab.
 * @example const [view, setView] = usePreference('level-view', ['diagram', 'table']);   // the first is the default
 */
export function usePreference<T extends string>(
  name: PreferenceName,
  choices: readonly [T, ...T[]],
): [T, (value: T) => void] {
  const kept = useSyncExternalStore(onPreferenceChange, () => readPreference(name));
  const value = choices.find((choice) => choice === kept) ?? choices[0];
  return [value, (next) => keepPreference(name, next)];
}
