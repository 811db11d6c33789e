import type { DealView } from '@lydite/contracts';
import { useWords } from '../../market/use-words.ts';

/** Every step of a deal with its time and actor, as both sides see it; the newest first. */
export function Timeline({ events }: { events: DealView['events'] }) {
  const { moment } = useWords();
  return (
    <section aria-labelledby="timeline-title" className="mt-10">
      <h2 id="timeline-title">Timeline</h2>
      <ol className="ruled ruled-head mt-2 pt-0!">
        {/* They come in the order they happened; several steps may share a moment. */}
        {events.toReversed().map((event) => (
          <li key={`${event.at} ${event.title}`} className="grid gap-x-6 md:grid-cols-[12rem_minmax(0,1fr)]">
            <time dateTime={event.at} className="mono small mute">
              {moment(event.at)}
            </time>
            <div className="small">
              <b>{event.title}</b> <span className="mute">· {event.by}</span>
              {event.detail && <p className="mute">{event.detail}</p>}
            </div>
          </li>
        ))}
      </ol>
    </section>
  );
}
