import { at, box, mark, svg, times } from './svg.mjs';

/** A block standing on a board: its shadow, its side, its top. */
export function raised(width, height, fill, { tall = 4, side = '#141516', round = 1 } = {}) {
  const size = svg`width="${width}" height="${height}" rx="${round}"`;
  const [x, y] = [-width / 2, -height / 2];
  return svg`<rect x="${x + tall * 0.5}" y="${y + tall * 1.1}" ${size} fill="#000" opacity=".38"/><rect x="${x}" y="${y}" ${size} fill="${side}"/><rect x="${x}" y="${y - tall * 0.5}" ${size} fill="${fill}"/>`;
}

const lettering = (width, height, label) => {
  if (!label) return '';
  const size = Math.min(height * 0.17, (width * 1.3) / label[0].length);
  return svg`${label.map((line, index) => mark(0, height * 0.02 + index * size * 1.35, size * (index ? 0.85 : 1), line))}`;
};

/** The moulded body of a plastic chip. */
export function mouldedBody(width, height, { label, tall = 4 } = {}) {
  const dot = Math.min(width, height) * 0.06;
  return svg`${raised(width, height, 'url(#plastic)', { tall })}<g transform="translate(0 ${-tall / 2})"><circle cx="${-width / 2 + dot * 2.4}" cy="${-height / 2 + dot * 2.4}" r="${dot}" fill="#151617"/><rect x="${-width / 2 + 1}" y="${-height / 2 + 0.6}" width="${width - 2}" height="1" fill="#fff" opacity=".14"/>${lettering(width, height, label)}</g>`;
}

const leadRow = (count, length, reach, across, colour) => {
  const pitch = length / count;
  return times(count, (index) => {
    const along = -length / 2 + pitch * (index + 0.22);
    return across
      ? svg`<rect x="${along}" y="${-reach / 2}" width="${pitch * 0.52}" height="${reach}" fill="${colour}"/>`
      : svg`<rect x="${-reach / 2}" y="${along}" width="${reach}" height="${pitch * 0.52}" fill="${colour}"/>`;
  });
};

/** A chip with leads on two long sides. */
export function dualChip(width, height, { label, leads = 8, reach = 6, colour = 'url(#nickel)' } = {}) {
  const off = height / 2 + reach / 2 - 1;
  const row = leadRow(leads, width * 0.94, reach, true, colour);
  return {
    width,
    height: height + reach * 2,
    face: svg`${at(0, -off, row)}${at(0, off, row)}${mouldedBody(width, height, { label, tall: 3 })}`,
  };
}

/** A square chip with leads on four sides. */
export function quadChip(size, { label, leads = 16, reach = 5, colour = 'url(#nickel)' } = {}) {
  const off = size / 2 + reach / 2 - 1;
  const flat = leadRow(leads, size * 0.92, reach, true, colour);
  const upright = leadRow(leads, size * 0.92, reach, false, colour);
  const face = svg`${at(0, -off, flat)}${at(0, off, flat)}${at(-off, 0, upright)}${at(off, 0, upright)}${mouldedBody(size, size, { label, tall: 3 })}`;
  return { width: size + reach * 2, height: size + reach * 2, face };
}

/** A ball-grid package on its board: a resin plate with a moulded top. */
export function gridChip(size, { label, plate = 'url(#mask-dark-green)', top = 0.86 } = {}) {
  const face = svg`${raised(size, size, plate, { tall: 3, side: '#0e241c' })}${at(0, -2, mouldedBody(size * top, size * top, { label, tall: 2 }))}`;
  return { width: size, height: size, face };
}

/** A bare die on a resin plate, ringed with small parts. */
export function dieChip(size, { plate = 'url(#mask-dark-green)' } = {}) {
  const ring = times(24, (index) => {
    const angle = (index / 24) * Math.PI * 2;
    return svg`<rect x="${Math.cos(angle) * size * 0.37 - 1.5}" y="${Math.sin(angle) * size * 0.37 - 1}" width="4" height="2.4" fill="#c3b08a"/>`;
  });
  const face = svg`${raised(size, size, plate, { tall: 3, side: '#0e241c' })}${at(0, -1, svg`${ring}${raised(size * 0.42, size * 0.38, 'url(#steel)', { tall: 2, side: '#53585a' })}`)}`;
  return { width: size, height: size, face };
}

/** A tinned can over radio or clock parts. */
export function shieldCan(width, height, { holes = true } = {}) {
  const [columns, rows] = [Math.floor(width / 12), Math.floor(height / 12)];
  const pattern = holes
    ? times(columns * rows, (index) => {
        const x = ((index % columns) + 0.5) * 12 - (columns * 12) / 2;
        const y = (Math.floor(index / columns) + 0.5) * 12 - (rows * 12) / 2;
        return svg`<circle cx="${x}" cy="${y - 2}" r="1.7" fill="#565b5d"/>`;
      })
    : '';
  return {
    width,
    height,
    face: svg`${raised(width, height, 'url(#steel)', { tall: 4, side: '#6d7274', round: 2 })}${pattern}`,
  };
}

/** A grid of round pads or pins; `keep(column, row, ring)` says which are there. */
export function padGrid({ columns, rows, pitch, radius, keep = () => true, fill = '#dcb45f', glint = '#fff0c2' }) {
  return times(columns * rows, (index) => {
    const [column, row] = [index % columns, Math.floor(index / columns)];
    const ring = Math.min(column, row, columns - 1 - column, rows - 1 - row);
    if (!keep(column, row, ring)) return '';
    const [x, y] = [(column - (columns - 1) / 2) * pitch, (row - (rows - 1) / 2) * pitch];
    const light = glint
      ? svg`<circle cx="${x - radius * 0.28}" cy="${y - radius * 0.32}" r="${radius * 0.42}" fill="${glint}"/>`
      : '';
    return svg`<circle cx="${x}" cy="${y}" r="${radius}" fill="${fill}"/>${light}`;
  });
}

/** A paper label with a bar code, never the same twice. */
export function barLabel(width, height, random) {
  const bars = times(
    24,
    (index) =>
      svg`<rect x="${width * (-0.44 + index * 0.036)}" y="0" width="${width * random.between(0.008, 0.024)}" height="${height * 0.34}" fill="#26282a"/>`,
  );
  return svg`${box(width, height, '#efede4')}${bars}<rect x="${-width * 0.44}" y="${-height * 0.36}" width="${width * 0.6}" height="${height * 0.1}" fill="#4c4e50"/><rect x="${-width * 0.44}" y="${-height * 0.18}" width="${width * 0.42}" height="${height * 0.08}" fill="#77797a"/>`;
}
