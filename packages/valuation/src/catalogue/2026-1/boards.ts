import type { MaterialClass, Parameter } from '../catalogue.types.ts';
import { boardHazards, phoneHazards, relayHazards } from './hazards.ts';
import { ln, weighedPieces } from './parameters.ts';

const literature = 'eight literature sets for boards, 68–1 000 g/t (review, Adv. Mater. Sci. Eng. 2022, 6550089)';

interface Board {
  code: string;
  name: string;
  one: string;
  many: string;
  hazards: string;
  pieceMassG: Parameter | null;
  gradeGPerT: Parameter;
}

/** A board class is reckoned by its grade alone. */
const board = ({ code, name, one, many, hazards, pieceMassG, gradeGPerT }: Board): MaterialClass => ({
  code,
  name,
  group: 'boards',
  unit: { one, many },
  hazards,
  pieceMassG,
  components: [{ kind: 'grade', id: 'grade', name: 'whole board', parameters: { gradeGPerT } }],
});

export const boardClasses: MaterialClass[] = [
  board({
    code: 'desktop-boards',
    name: 'Desktop main boards',
    one: 'desktop main board',
    many: 'desktop main boards',
    hazards: boardHazards,
    pieceMassG: ln(750, 1.3, weighedPieces),
    gradeGPerT: ln(220, 1.7, literature),
  }),
  board({
    code: 'notebook-boards',
    name: 'Notebook main boards',
    one: 'notebook main board',
    many: 'notebook main boards',
    hazards: boardHazards,
    pieceMassG: ln(310, 1.3, weighedPieces),
    gradeGPerT: ln(260, 1.8, literature),
  }),
  board({
    code: 'server-boards',
    name: 'Server and workstation boards',
    one: 'server board',
    many: 'server boards',
    hazards: boardHazards,
    pieceMassG: ln(1900, 1.5, weighedPieces),
    gradeGPerT: ln(280, 1.8, `assumed; ${literature}`),
  }),
  board({
    code: 'network-boards',
    name: 'Network equipment boards',
    one: 'network board',
    many: 'network boards',
    hazards: boardHazards,
    pieceMassG: null,
    gradeGPerT: ln(
      200,
      1.8,
      'router, modem and hub boards 199 g/t, n = 10 (Holgersson et al. 2018, Resour. Conserv. Recycl. 133:300–308)',
    ),
  }),
  board({
    code: 'telecom-boards',
    name: 'Telecom and backplane boards',
    one: 'telecom board',
    many: 'telecom boards',
    hazards: relayHazards,
    pieceMassG: null,
    gradeGPerT: ln(350, 2.2, `assumed; ${literature}`),
  }),
  board({
    code: 'phone-boards',
    name: 'Phone boards, no battery',
    one: 'phone board',
    many: 'phone boards',
    hazards: phoneHazards,
    pieceMassG: ln(21, 1.35, weighedPieces),
    gradeGPerT: ln(
      550,
      2.4,
      '1 051 and 1 083 g/t, n = 30 each (Holgersson et al. 2018); 475 (Laubertová et al.); 90–170 (Vats & Singh 2015)',
    ),
  }),
  board({
    code: 'drive-boards',
    name: 'Hard-drive boards',
    one: 'hard-drive board',
    many: 'hard-drive boards',
    hazards: boardHazards,
    pieceMassG: ln(14, 1.4, weighedPieces),
    gradeGPerT: ln(350, 1.7, literature),
  }),
  board({
    code: 'player-boards',
    name: 'Optical-drive and player boards',
    one: 'player board',
    many: 'player boards',
    hazards: boardHazards,
    pieceMassG: ln(40, 1.5, weighedPieces),
    gradeGPerT: ln(150, 1.8, literature),
  }),
  board({
    code: 'console-boards',
    name: 'Game console boards',
    one: 'console board',
    many: 'console boards',
    hazards: boardHazards,
    pieceMassG: ln(400, 1.4, weighedPieces),
    gradeGPerT: ln(200, 1.7, literature),
  }),
  board({
    code: 'low-grade-boards',
    name: 'Low-grade boards: power, monitor, appliance',
    one: 'low-grade board',
    many: 'low-grade boards',
    hazards: relayHazards,
    pieceMassG: null,
    gradeGPerT: ln(20, 2.2, 'assumed: far below the high-grade boundary of 100 g/t (Chancerel 2010)'),
  }),
  board({
    code: 'mixed-boards',
    name: 'Mixed boards, unsorted',
    one: 'mixed board',
    many: 'mixed boards',
    hazards: relayHazards,
    pieceMassG: null,
    gradeGPerT: ln(100, 2.3, 'assumed: at the high-grade boundary of 100 g/t (Chancerel 2010), wide since unsorted'),
  }),
];
