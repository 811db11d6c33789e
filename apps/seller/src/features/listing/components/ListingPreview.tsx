import type { PhotoView } from '@lydite/contracts';
import { FactList, type Fact } from '@lydite/ui';
import { photoSrc } from '../../../lib/photo-src.ts';

interface ListingPreviewProps {
  title: string;
  description: string;
  photos: readonly PhotoView[];
  facts: readonly Fact[];
  lines: readonly { id: string; name: string; kind: string; words: string }[];
}

/** What buyers will read and see of the lot; its streak stands beside the page. */
export function ListingPreview({ title, description, photos, facts, lines }: ListingPreviewProps) {
  return (
    <section className="mt-8" aria-labelledby="preview">
      <h2 id="preview">What buyers will see</h2>
      <div className="sheet mt-3">
        <div className="sheet-body">
          <div>
            <p className="say font-semibold">{title || 'No title yet'}</p>
            {description && <p className="mt-1 whitespace-pre-line mute">{description}</p>}
          </div>
          {photos.length > 0 && (
            <ul className="preview-photos">
              {photos.map(({ id, description: alt, colour }) => (
                <li key={id}>
                  <img src={photoSrc(id, 'list')} alt={alt} loading="lazy" style={{ backgroundColor: colour }} />
                </li>
              ))}
            </ul>
          )}
          <ul className="ruled">
            {lines.map(({ id, name, kind, words }) => (
              <li key={id}>
                <b>{name}</b>
                <p className="small mute">{name === kind ? words : `${kind}. ${words}`}</p>
              </li>
            ))}
          </ul>
          <FactList facts={facts} />
        </div>
      </div>
    </section>
  );
}
