import { catalogueQuery, Refusal, useMember, useTitle, useWords } from '@lydite/client';
import { Button } from '@lydite/ui';
import { useSuspenseQuery } from '@tanstack/react-query';
import { useNavigate } from 'react-router-dom';
import { useDraft } from '../../features/draft/draft-context.tsx';
import { forgetKept } from '../../features/draft/draft.queries.ts';
import { stepNames, stepOfPart } from '../../features/draft/steps.ts';
import { Declarations } from '../../features/listing/components/Declarations.tsx';
import { MissingList } from '../../features/listing/components/MissingList.tsx';
import { listingFacts } from '../../features/listing/listing-words.ts';
import { ListingPreview } from '../../features/listing/components/ListingPreview.tsx';
import { useListLot } from '../../features/listing/listing.queries.ts';
import { amountWords, classOf, lineName, platingWords } from '../../features/lines/line-words.ts';
import { DeleteDraft } from '../../features/lots/components/DeleteDraft.tsx';
import { useHashFocus } from '../../lib/use-hash-focus.ts';

/** The lot as buyers will see it, what it still lacks, what the seller declares; and the button that opens it to the market. */
export function Component() {
  useTitle('Check and list');
  const { lot, draft, edit, flush, refresh } = useDraft();
  const { data: catalogue } = useSuspenseQuery(catalogueQuery());
  const { money } = useWords();
  const member = useMember();
  const navigate = useNavigate();
  const list = useListLot(flush);
  useHashFocus();
  const isReady = lot.missing.length === 0;
  /** The device forgets a draft that is none any more. */
  const leave = (to: string) => {
    if (member) void forgetKept(member.id, lot.code);
    void navigate(to, { replace: true });
  };
  const send = () =>
    list.mutate(undefined, { onSuccess: () => leave(`/lots/${lot.code}`), onError: () => void refresh() });

  return (
    <>
      <h1>Check and list</h1>
      <p className="lead">
        A listed lot’s lines never change. To change something later you withdraw it, copy it and list it anew.
      </p>
      <MissingList
        items={lot.missing.map((item) => ({
          message: item.message,
          page: item.part === 'declarations' ? 'Below' : stepNames[stepOfPart(item.part)],
          to: `/lots/${lot.code}/${stepOfPart(item.part)}#${item.path}`,
        }))}
      />
      <ListingPreview
        title={draft.title}
        description={draft.description}
        photos={lot.photos}
        facts={listingFacts(draft, money)}
        lines={draft.lines.map((line, index) => ({
          id: line.id,
          name: lineName(line, index),
          kind: classOf(catalogue, line.classCode)?.name ?? 'Kind not chosen',
          words: [amountWords(line), platingWords(line)].filter(Boolean).join(', '),
        }))}
      />
      <h2 className="ruled-head mt-10 mb-4">What you declare</h2>
      <Declarations
        declarations={draft.declarations}
        onChange={(change) => {
          edit((current) => ({ ...current, declarations: { ...current.declarations, ...change } }));
          // A choice shows at once what is still missing; text waits until its field is left.
          if (!('batteriesNote' in change) && !('hazardNote' in change)) void flush();
        }}
      />
      <div className="mt-8">
        <Refusal>{list.error?.message}</Refusal>
        <div className="actions">
          <Button
            look="primary"
            busy={list.isPending && 'Listing'}
            aria-disabled={!isReady}
            onClick={() => (isReady ? send() : document.getElementById('missing')?.focus())}
          >
            List it
          </Button>
          <span className="small mute">
            {isReady
              ? 'The estimate is frozen at this moment, and a bid taken binds both sides.'
              : 'Opens when nothing is missing.'}
          </span>
        </div>
        <DeleteDraft lotCode={lot.code} onDeleted={() => leave('/lots')} />
      </div>
    </>
  );
}
