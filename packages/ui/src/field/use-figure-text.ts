import { useState } from 'react';

interface FigureText<T> {
  /** The figure the page holds; null while there is none or the text can't be read. */
  value: T | null;
  parse: (text: string) => T | null;
  format: (value: T) => string;
}

/** Keeps what was typed as long as it means the held figure; a figure changed from outside replaces the text. */
export function useFigureText<T>({ value, parse, format }: FigureText<T>): [string, (text: string) => void] {
  const [text, setText] = useState(() => (value === null ? '' : format(value)));
  const isCurrent = parse(text) === value;
  return [isCurrent ? text : value === null ? '' : format(value), setText];
}
