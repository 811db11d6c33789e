import { ballGridPackages } from './subjects/ball-grid-packages.mjs';
import { cardModules } from './subjects/card-modules.mjs';
import { ceramicProcessors } from './subjects/ceramic-processors.mjs';
import { wholeConnectors } from './subjects/connectors.mjs';
import { consoleBoards } from './subjects/console-boards.mjs';
import { contactPins } from './subjects/contact-pins.mjs';
import { desktopBoards } from './subjects/desktop-boards.mjs';
import { edgeContactsClose, edgeContactsHeap } from './subjects/edge-contacts.mjs';
import { expansionCards } from './subjects/expansion-cards.mjs';
import { fibreLand, fibrePinned } from './subjects/fibre-processors.mjs';
import { hardDriveBoards } from './subjects/hard-drive-boards.mjs';
import { memoryClose, memoryRows } from './subjects/memory.mjs';
import { mixedCrate } from './subjects/mixed-crate.mjs';
import { networkBoards } from './subjects/network-boards.mjs';
import { notebookBoards } from './subjects/notebook-boards.mjs';
import { packageTopsDish } from './subjects/package-tops.mjs';
import { phoneBoards } from './subjects/phone-boards.mjs';
import { plasticChips } from './subjects/plastic-chips.mjs';
import { playerBoards } from './subjects/player-boards.mjs';
import { powerBoards } from './subjects/power-boards.mjs';
import { serverBoards } from './subjects/server-boards.mjs';
import { telecomCard } from './subjects/telecom-card.mjs';
import { memoryCrateScale, sackFloorScale, weighTicket } from './subjects/weighing.mjs';

/** File name (without its ending) to the function that sets up the scene. */
export const subjects = {
  'edge-contacts-heap': edgeContactsHeap,
  'edge-contacts-close': edgeContactsClose,
  'memory-rows': memoryRows,
  'memory-close': memoryClose,
  'memory-crate-scale': memoryCrateScale,
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
  'ceramic-processors': ceramicProcessors,
  'fibre-processors-pinned': fibrePinned,
  'fibre-processors-land': fibreLand,
  'ball-grid-packages': ballGridPackages,
  'package-tops-dish': packageTopsDish,
  'plastic-chips': plasticChips,
  'contact-pins': contactPins,
  'connectors-whole': wholeConnectors,
  'card-modules': cardModules,
  'mixed-boards-crate': mixedCrate,
  'sack-floor-scale': sackFloorScale,
  'weigh-ticket': weighTicket,
};
