import type { PhotoSlot } from '@lydite/contracts';

export interface Shot {
  slot: PhotoSlot;
  title: string;
  hint: string;
  /** What stands as the description until the seller writes another. */
  caption: string;
  /** Detail decides here, so the picture is sent as it was taken. */
  isCloseUp: boolean;
}

/** The shots that tell buyers most, in the order to take them. */
export const shots: readonly Shot[] = [
  {
    slot: 'whole',
    title: 'The whole lot, from above',
    hint: 'Spread out, with a ruler beside it. Say its length in the description.',
    caption: 'The whole lot from above, with a ruler',
    isCloseUp: false,
  },
  {
    slot: 'one-piece',
    title: 'One piece, contacts filling the frame',
    hint: 'Ruler in view. Wear and the colour of the gold show here.',
    caption: 'One piece, contacts close up',
    isCloseUp: true,
  },
  {
    slot: 'on-scale',
    title: 'On the scale, reading legible',
    hint: 'Type the reading into the description too.',
    caption: 'On the scale',
    isCloseUp: false,
  },
  {
    slot: 'odd-ones',
    title: 'Anything that does not belong',
    hint: 'Pieces of another kind, steel, batteries, damage.',
    caption: 'What does not belong to the kind',
    isCloseUp: false,
  },
  {
    slot: 'markings',
    title: 'Markings or labels, close up',
    hint: 'They tell the maker and the year.',
    caption: 'Markings close up',
    isCloseUp: true,
  },
];

const other: Shot = { slot: 'other', title: 'Another photo', hint: '', caption: '', isCloseUp: false };

export const shotOf = (slot: PhotoSlot): Shot => shots.find((shot) => shot.slot === slot) ?? other;
