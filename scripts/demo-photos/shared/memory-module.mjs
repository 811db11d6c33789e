import { createBoard, edgeContacts, passive } from './boards.mjs';
import { barLabel, dualChip, gridChip } from './packages.mjs';
import { at, svg } from './svg.mjs';

const makes = [
  { mask: 'green', label: ['VM 12', '1138 K4'], chips: 8, grid: false },
  { mask: 'green', label: ['QT-64', '0927 B'], chips: 8, grid: true },
  { mask: 'dark-green', label: ['VM 31', '1402 A2'], chips: 9, grid: true },
  { mask: 'blue', label: ['NR 8M', '0416 F'], chips: 8, grid: false },
  { mask: 'black', label: ['QT-96', '1519 C'], chips: 8, grid: true },
];

/** A memory module with its gold contacts towards the reader, `width` scene pixels long. */
export function memoryModule(width, random, { make = random.pick(makes), label = random.chance(0.75) } = {}) {
  const height = width * 0.228;
  const [x, y] = [width / 2, height / 2];
  const [bite, key] = [height * 0.055, width * 0.02];
  const outline = svg`M${-x} ${-y}H${x}V${-bite}a${bite} ${bite} 0 0 0 0 ${bite * 2}V${y}H${key + key}V${y - height * 0.1}a${key * 0.5} ${key * 0.5} 0 0 0 ${-key} 0V${y}H${-x}V${bite}a${bite} ${bite} 0 0 0 0 ${-bite * 2}Z`;
  const board = createBoard({ width, height, mask: make.mask, random, outline, thickness: width * 0.006 });
  const pitch = width / (make.chips + 0.6);
  for (let index = 0; index < make.chips; index += 1) {
    const spot = (index - (make.chips - 1) / 2) * pitch;
    const chip = make.grid
      ? gridChip(Math.min(pitch * 0.8, height * 0.5), { label: width > 600 && make.label, top: 0.94 })
      : dualChip(pitch * 0.62, height * 0.44, { label: width > 600 && make.label, leads: 12, reach: height * 0.045 });
    board.put({ ...chip, width: chip.width - 6, height: chip.height - 6 }, spot, -height * 0.12);
  }
  const contacts = edgeContacts({
    width: width * 0.95,
    tall: height * 0.13,
    pitch: (width * 0.95) / 92,
    gaps: [[0.505, 0.545]],
    random,
  });
  board.reserve(0, y - height * 0.08, width, height * 0.16);
  board.print(at(0, y - height * 0.075, contacts));
  board.scatter(Math.round(width / 16), () => ({ ...passive(random, width / 620), fixed: true }), {
    gap: 1,
    margin: height * 0.04,
  });
  const part = board.finish();
  const sticker = at(
    random.around(0, width * 0.25),
    -height * 0.13,
    barLabel(width * 0.2, height * 0.36, random),
    random.around(0, 3),
  );
  return label ? { ...part, face: svg`${part.face}${sticker}` } : part;
}
