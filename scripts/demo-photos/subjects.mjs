import { expansionCards, networkBoards, telecomCard } from './subjects/cards.mjs';
import { edgeContactsClose, edgeContactsHeap } from './subjects/edge-contacts.mjs';
import { consoleBoards, desktopBoards, notebookBoards, serverBoards } from './subjects/main-boards.mjs';
import { memoryClose, memoryRows } from './subjects/memory.mjs';
import { hardDriveBoards, phoneBoards, playerBoards, powerBoards } from './subjects/small-boards.mjs';

/** File name (without its ending) to the function that sets up the scene. */
export const subjects = {
  'edge-contacts-heap': edgeContactsHeap,
  'edge-contacts-close': edgeContactsClose,
  'memory-rows': memoryRows,
  'memory-close': memoryClose,
  'expansion-cards': expansionCards,
  'desktop-main-boards': desktopBoards,
  'notebook-boards': notebookBoards,
  'server-boards': serverBoards,
  'network-boards': networkBoards,
  'telecom-card': telecomCard,
  'phone-boards': phoneBoards,
  'hard-drive-boards': hardDriveBoards,
  'player-boards': playerBoards,
  'console-boards': consoleBoards,
  'power-boards': powerBoards,
};
