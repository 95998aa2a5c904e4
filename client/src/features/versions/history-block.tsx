import { chakra } from '@chakra-ui/react';
import { type EditedVersionFragment } from '../../gql/graphql';
import { formatShortDate } from '../../lib/format-quantity';
import { versionStrings } from '../../strings/versions';
import { MarginBlock } from '../../ui/page/margin-block';

type Event = EditedVersionFragment['events'][number];

/** Changes by one person in a row are told once, with the last date. */
export function mergedEvents(events: readonly Event[]): Event[] {
  return events.filter((event, i) => {
    const next = events[i + 1];
    return !(event.action === 'change' && next?.action === 'change' && next.person.id === event.person.id);
  });
}

/** Who did what, newest first. */
export function HistoryBlock({ events, note }: { readonly events: readonly Event[]; readonly note: string }) {
  const actions: Readonly<Record<string, string>> = versionStrings.actions;
  return (
    <>
      <MarginBlock title={versionStrings.edit.history}>
        <chakra.ol listStyle="none">
          {mergedEvents(events)
            .reverse()
            .map((event) => (
              <chakra.li key={`${event.at} ${event.action}`} marginTop="5px">
                <chakra.span color="ink">{`${formatShortDate(event.at)}, ${actions[event.action] ?? event.action}`}</chakra.span>
                {` by ${event.person.name}`}
                {event.remark && <chakra.span display="block">{event.remark}</chakra.span>}
              </chakra.li>
            ))}
        </chakra.ol>
      </MarginBlock>
      <MarginBlock>
        <p>{note}</p>
      </MarginBlock>
    </>
  );
}
