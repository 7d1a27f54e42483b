import { useEffect, useRef, useState } from 'react';

/** A moment's rest in typing: browsers limit how often an address may change. */
const REST_MS = 250;

/**
 * What is typed into a field whose text stands in the address. The letters are the field's own; the address follows
 * when typing rests (`onRest`), and leads when it changes by itself.
 */
export function useRestingText(
  inAddress: string,
  onRest: (text: string) => void,
): [string, (letters: string) => void] {
  const [letters, setLetters] = useState(inAddress);
  const written = useRef(inAddress);
  const rest = useRef(onRest);
  useEffect(() => {
    rest.current = onRest;
  });
  useEffect(() => {
    if (inAddress === written.current) return;
    written.current = inAddress;
    setLetters(inAddress);
  }, [inAddress]);
  useEffect(() => {
    if (letters === written.current) return;
    const timer = setTimeout(() => {
      written.current = letters;
      rest.current(letters);
    }, REST_MS);
    return () => clearTimeout(timer);
  }, [letters]);
  return [letters, setLetters];
}
