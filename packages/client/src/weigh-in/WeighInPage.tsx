import { weighInRequest, type DealView, type FieldError, type WeighInRequest } from '@lydite/contracts';
import { Button, ErrorSummary, MeasureField, Page, TextArea, TextField } from '@lydite/ui';
import { useSuspenseQuery } from '@tanstack/react-query';
import { useState, type FormEvent } from 'react';
import { Link, useNavigate, useParams } from 'react-router-dom';
import { isApiError } from '../call/api-error.ts';
import { call } from '../call/call.ts';
import { dealQuery, useDealStep } from '../deals/deals.queries.ts';
import { NotNow } from '../deals/parts/NotNow.tsx';
import { Refusal } from '../form/Refusal.tsx';
import { announce } from '../shell/announce.ts';
import { useTitle } from '../shell/use-title.ts';
import { NetMass } from './NetMass.tsx';
import { usePhotoUploads } from './use-photo-uploads.ts';
import { closeDraft, keepDraft, readDraft, type WeighInDraft } from './weigh-in-draft.ts';
import { toWeighInRequest } from './weigh-in.rules.ts';
import { WeighInPhotos } from './WeighInPhotos.tsx';

export function Component() {
  const { dealCode = '' } = useParams();
  const { data: deal } = useSuspenseQuery(dealQuery(dealCode));
  if (!deal.actions.includes('weigh_in')) return <NotNow deal={deal} />;
  return <WeighInForm deal={deal} />;
}

const missing: Record<string, string> = {
  grossG: 'Enter the gross mass, as the scale showed it.',
  tareG: 'Enter the tare: the mass of crate, pallet and packing. Enter 0 if there was none.',
  scaleResolutionG: 'Enter the smallest step the scale shows.',
};

/** What the request's schema says of it, in the words of this form where a figure is missing. */
function checkRequest(request: WeighInRequest): FieldError[] {
  const parsed = weighInRequest.safeParse(request);
  if (parsed.success) return [];
  return parsed.error.issues.map(({ path, message }) => {
    const name = String(path[0]);
    return { path: name, message: missing[name] ?? message };
  });
}

/** Filled in beside the scale, on a phone as a rule: everything is kept on the device until it is sent. */
function WeighInForm({ deal }: { deal: DealView }) {
  const navigate = useNavigate();
  const [draft, setDraft] = useState(() => readDraft(deal.code));
  const [faults, setFaults] = useState<FieldError[]>([]);
  const enter = useDealStep((body: WeighInRequest) =>
    call('POST /deals/:dealCode/weigh-in', { params: { dealCode: deal.code }, body }),
  );
  useTitle('Weigh-in');
  const change = (part: (before: WeighInDraft) => Partial<WeighInDraft>) =>
    setDraft((before) => {
      const next = { ...before, ...part(before) };
      keepDraft(deal.code, next);
      return next;
    });
  const uploads = usePhotoUploads(deal.code, (photo) => change(({ photos }) => ({ photos: [...photos, photo] })));
  const errorOf = (path: string) => faults.find((fault) => fault.path === path)?.message ?? null;

  const submit = (event: FormEvent) => {
    event.preventDefault();
    const request = toWeighInRequest(
      draft,
      draft.photos.map(({ id }) => id),
    );
    const found = checkRequest(request);
    setFaults(found);
    if (found.length > 0) return;
    enter.mutate(request, {
      onSuccess: () => {
        closeDraft(deal.code, draft);
        announce('The weigh-in is entered.', { own: true });
        void navigate(`/deals/${deal.code}`, { replace: true });
      },
      onError: (error) => setFaults(isApiError(error) ? error.fields : []),
    });
  };

  return (
    <Page shape="narrow">
      <p className="small">
        <Link to={`/deals/${deal.code}`}>Deal {deal.code}</Link>
      </p>
      <h1 className="mt-2">Weigh-in</h1>
      <p className="lead">{deal.title}. The seller sees what you enter, with the photos, and countersigns it.</p>
      <ErrorSummary problems={faults.map(({ path, message }) => ({ fieldId: path, message }))} />
      <form onSubmit={submit} noValidate className="fields mt-6 max-w-md">
        <MeasureField
          id="grossG"
          label="Gross"
          hint="Everything on the scale, as it arrived"
          kind="mass"
          entry={draft.gross}
          error={errorOf('grossG')}
          onChange={(gross) => change(() => ({ gross }))}
        />
        <MeasureField
          id="tareG"
          label="Tare"
          hint="Crate, pallet and packing alone"
          kind="mass"
          entry={draft.tare}
          error={errorOf('tareG')}
          onChange={(tare) => change(() => ({ tare }))}
        />
        <MeasureField
          id="scaleResolutionG"
          label="The scale reads to"
          hint="The smallest step it shows"
          kind="mass"
          entry={draft.resolution}
          error={errorOf('scaleResolutionG')}
          onChange={(resolution) => change(() => ({ resolution }))}
        />
        <NetMass entries={draft} declaredG={deal.massG} />
        <WeighInPhotos
          photos={draft.photos}
          pending={uploads.pending}
          error={errorOf('photoIds')}
          onAdd={uploads.add}
          onRetry={uploads.retry}
          onDrop={uploads.drop}
          onRemove={(id) => change(({ photos }) => ({ photos: photos.filter((photo) => photo.id !== id) }))}
        />
        <TextField
          id="scaleSerial"
          label="Serial number of the scale"
          optional
          autoComplete="off"
          value={draft.scaleSerial}
          error={errorOf('scaleSerial')}
          onChange={({ target }) => change(() => ({ scaleSerial: target.value }))}
        />
        <TextArea
          id="note"
          label="Note"
          optional
          hint="Damage, wet packing, anything the seller should know"
          value={draft.note}
          error={errorOf('note')}
          onChange={({ target }) => change(() => ({ note: target.value }))}
        />
        <Refusal>{faults.length === 0 ? enter.error?.message : null}</Refusal>
        <div>
          <Button look="primary" type="submit" busy={enter.isPending && 'Sending'}>
            Enter the weigh-in
          </Button>
          <p className="small mute mt-2">It can’t be changed afterwards. What you type is kept on this device.</p>
        </div>
      </form>
    </Page>
  );
}
