import { Refusal } from '@lydite/client';
import { Button } from '@lydite/ui';
import { useDeleteDraft } from '../lots.queries.ts';

interface DeleteDraftProps {
  lotCode: string;
  onDeleted: () => void;
}

/** Letting a draft go, behind a second press: it cannot be had back. */
export function DeleteDraft({ lotCode, onDeleted }: DeleteDraftProps) {
  const remove = useDeleteDraft(lotCode);
  return (
    <details className="more mt-8">
      <summary>Delete this draft</summary>
      <p className="small mute">Its photos and lines are gone for good, here and on every device.</p>
      <Refusal>{remove.error?.message}</Refusal>
      <p className="mt-3">
        <Button
          look="danger"
          busy={remove.isPending && 'Deleting'}
          onClick={() => remove.mutate(undefined, { onSuccess: onDeleted })}
        >
          Delete {lotCode}
        </Button>
      </p>
    </details>
  );
}
