import { catalogueQuery, useTitle } from '@lydite/client';
import type { LineDraft } from '@lydite/contracts';
import { Button, TextArea, TextField } from '@lydite/ui';
import { useSuspenseQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { useLocation } from 'react-router-dom';
import { useDraft } from '../../features/draft/draft-context.tsx';
import { LineCard } from '../../features/lines/components/LineCard.tsx';
import { emptyLine, type LineChange } from '../../features/lines/line-draft.ts';
import { useHashFocus } from '../../lib/use-hash-focus.ts';
import { useDraftOutlet } from './DraftPage.tsx';

const mostLines = 30;

/** What the lot is called and what is in it, line by line. */
export function Component() {
  useTitle('What is in the lot?');
  const { draft, edit } = useDraft();
  const { live, checks } = useDraftOutlet();
  const { data: catalogue } = useSuspenseQuery(catalogueQuery());
  const [openId, setOpenId] = useOpenLine(draft.lines);
  useHashFocus();

  const setLines = (change: (lines: LineDraft[]) => LineDraft[]) =>
    edit((current) => ({ ...current, lines: change(current.lines) }));
  const changeLine = (id: string, change: LineChange) =>
    setLines((lines) => lines.map((line) => (line.id === id ? { ...line, ...change } : line)));
  const addLine = () => {
    const line = emptyLine();
    setLines((lines) => [...lines, line]);
    setOpenId(line.id);
  };

  return (
    <>
      <h1>What is in the lot?</h1>
      <p className="lead">
        One line for each kind you can tell apart. Say how you know each number: a guess is fine, it only makes the
        streak wider.
      </p>
      <div className="fields mt-6 mb-7">
        <TextField
          label="Title"
          id="title"
          hint="What buyers read first: what it is, and how much; at most 90 characters."
          value={draft.title}
          onChange={(event) => edit((current) => ({ ...current, title: event.target.value.slice(0, 90) }))}
        />
      </div>
      <div id="lines" tabIndex={-1}>
        {draft.lines.map((line, index) => (
          <LineCard
            key={line.id}
            index={index}
            line={line}
            lines={draft.lines}
            catalogue={catalogue}
            warnings={live.warnings.filter(({ lineId }) => lineId === line.id)}
            checks={checks}
            isOpen={line.id === openId}
            onOpen={() => setOpenId(line.id)}
            onDone={() => setOpenId(null)}
            onRemove={() => setLines((lines) => lines.filter(({ id }) => id !== line.id))}
            onChange={(change) => changeLine(line.id, change)}
          />
        ))}
      </div>
      {draft.lines.length < mostLines && (
        <p className="mt-4">
          <Button onClick={addLine}>{draft.lines.length === 0 ? 'Add the first line' : 'Add a line'}</Button>
        </p>
      )}
      <div className="mt-8">
        <TextArea
          label="Description"
          optional
          hint="Where it comes from, how it was sorted and stored, what a buyer should know."
          value={draft.description}
          onChange={(event) => edit((current) => ({ ...current, description: event.target.value.slice(0, 2000) }))}
        />
      </div>
    </>
  );
}

/** The line being described: the one a link named, else the first without a kind, else none. */
function useOpenLine(lines: readonly LineDraft[]) {
  const { hash } = useLocation();
  const named = /^#lines\.(\d+)\./.exec(decodeURIComponent(hash))?.[1];
  return useState<string | null>(
    () => (named === undefined ? lines.find(({ classCode }) => classCode === null) : lines[Number(named)])?.id ?? null,
  );
}
