import { VisuallyHidden } from '../../../shared-ui/visually-hidden';
import { useSettled } from './use-worked';

const STILL_MS = 700;

/** The answer read aloud, politely, once the hand has rested. */
export function StillWords({ words }: { words: string }) {
  return (
    <VisuallyHidden>
      <span role="status">{useSettled(words, STILL_MS)}</span>
    </VisuallyHidden>
  );
}
