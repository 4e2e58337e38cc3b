import { useCallback, useEffect, useState } from 'react';
import { useLocation, useNavigate } from 'react-router-dom';
import { useDraftOwner } from '../../../shared-ui/draft-owner';
import type { Family } from '../frame/families';
import { searchOf, textsOf } from './address';
import type { BenchInputs } from './fields';
import { keepSearch } from './kept-inputs';
import type { TypedTexts } from './read-values';

/** The address is written once the hand rests: browsers refuse a hundred changes in half a minute. */
const ADDRESS_AFTER_MS = 400;

export interface Bench<F extends BenchInputs> {
  family: Family;
  inputs: F;
  /** Text of every input, as typed or as it started. */
  texts: TypedTexts;
  /** The same function as long as the page stands. */
  type: (name: string, text: string) => void;
  /** The address that holds all this, for a link to somebody else. */
  link: () => string;
}

/**
 * The inputs of a page, held in its address so that they can be sent, and kept on this device.
 * @param inputs - a constant: the same object on every render.
 */
export function useBench<F extends BenchInputs>(family: Family, inputs: F): Bench<F> {
  const { pathname, search } = useLocation();
  const navigate = useNavigate();
  const owner = useDraftOwner();
  const [typed, setTyped] = useState(() => textsOf(inputs, search));
  const now = search.replace(/^\?/, '');
  const [seen, setSeen] = useState(now);
  const [written, setWritten] = useState(now);
  if (now !== seen) {
    setSeen(now);
    // Not our own writing: somebody followed a link or went back, and the address leads.
    if (now !== written) {
      setWritten(now);
      setTyped(textsOf(inputs, now));
    }
  }

  useEffect(() => {
    const next = searchOf(inputs, typed);
    if (next === written) return undefined;
    const timer = setTimeout(() => {
      setWritten(next);
      keepSearch(owner, family, next);
      void navigate({ search: next }, { replace: true, preventScrollReset: true });
    }, ADDRESS_AFTER_MS);
    return () => clearTimeout(timer);
  }, [family, inputs, navigate, owner, typed, written]);

  const type = useCallback(
    (name: string, text: string) => setTyped((before) => ({ ...before, [name]: text })),
    [],
  );

  return {
    family,
    inputs,
    texts: Object.fromEntries(
      Object.entries(inputs).map(([name, { start }]) => [name, typed[name] ?? start]),
    ),
    type,
    link: () => {
      const query = searchOf(inputs, typed);
      return `${location.origin}${pathname}${query && `?${query}`}`;
    },
  };
}
