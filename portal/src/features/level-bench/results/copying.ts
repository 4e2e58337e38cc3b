import { useCallback } from 'react';
import { useToast } from '../../../shared-ui/toasts';

/** Copies a text and says so; where the browser will not, says that. */
export function useCopy(): (text: string, done: string) => void {
  const say = useToast();
  return useCallback(
    (text, done) => {
      const refused = () => say('This browser did not let us copy. Choose the text and copy it by hand.');
      // Without https there is no clipboard at all.
      if (!('clipboard' in navigator)) return refused();
      navigator.clipboard.writeText(text).then(() => say(done), refused);
    },
    [say],
  );
}
