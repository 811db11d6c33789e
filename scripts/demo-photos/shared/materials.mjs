import { svg } from './svg.mjs';

const gradient = (id, stops, direction = 'x2="1" y2="1"') =>
  svg`<linearGradient id="${id}" x1="0" y1="0" ${direction}>${stops.map(
    (colour, index) => svg`<stop offset="${index / (stops.length - 1)}" stop-color="${colour}"/>`,
  )}</linearGradient>`;

const down = 'x2="0" y2="1"';
const across = 'x2="1" y2="0"';

const gradients = [
  gradient('mask-green', ['#24704a', '#1a5c3d', '#114a31']),
  gradient('mask-dark-green', ['#1b5140', '#123f32', '#0c3026']),
  gradient('mask-lime', ['#4d8a44', '#3b7437', '#2c5e2b']),
  gradient('mask-blue', ['#23577a', '#19455f', '#0f3145']),
  gradient('mask-black', ['#33363a', '#25282b', '#191b1d']),
  gradient('mask-red', ['#8c2f2b', '#742421', '#591816']),
  gradient('mask-brown', ['#b28a52', '#9d7641', '#835f32']),
  gradient('plastic', ['#44474a', '#2f3133', '#232527', '#1b1c1e'], down),
  gradient('gold', ['#b98b34', '#f4d88c', '#d9ad55', '#a67b2d'], down),
  gradient('gold-bright', ['#e9c771', '#fff1c4', '#e3bb63', '#c0923d'], down),
  gradient('gold-dull', ['#8f6a29', '#bd9344', '#a27a33', '#77571f'], down),
  gradient('gold-lid', ['#f7e6b0', '#d9b05a', '#c2974a', '#a0752e']),
  gradient('ceramic-violet', ['#8a7f86', '#6d636a', '#534b52']),
  gradient('ceramic-grey', ['#8b8478', '#6d665b', '#544e45']),
  gradient('ceramic-pale', ['#d6d1c5', '#bcb6a7', '#9c9583']),
  gradient('resin-brown', ['#8b774e', '#6d5b3a', '#54452b']),
  gradient('resin-green', ['#54786a', '#3d5c50', '#2d463e']),
  gradient('steel', ['#c3c8c8', '#979d9f', '#adb2b3', '#757b7d']),
  gradient('steel-bright', ['#dfe2e2', '#adb3b4', '#cbcfd0', '#8d9395']),
  gradient('nickel', ['#7e8384', '#e3e6e6', '#b2b7b8', '#6e7374'], down),
  gradient('tin', ['#8d9091', '#d7dadb', '#9a9d9e'], across),
  gradient('brass', ['#8a6a2c', '#e2c47a', '#b58f45', '#74561f'], down),
  gradient('card', ['#c59f6d', '#b48c5a', '#a17a4b']),
  gradient('crate-blue', ['#3d6187', '#2d4c6d', '#203a55'], down),
  gradient('crate-inside', ['#13212f', '#22374c'], down),
  gradient('rubber', ['#4a4d4f', '#313436', '#202224'], down),
  gradient('paper', ['#fbfaf5', '#f1efe7', '#e6e3d8']),
  gradient('display', ['#b7c4a6', '#a3b193'], down),
  gradient('platform', ['#e4e6e6', '#b9bdbe', '#9da2a3'], down),
  gradient('weave', ['#cdc4aa', '#dcd5bd', '#b3a98a'], across),
];

const surface = (id, frequency, octaves, seed, depth) =>
  svg`<filter id="${id}" x="0" y="0" width="100%" height="100%"><feTurbulence type="fractalNoise" baseFrequency="${frequency}" numOctaves="${octaves}" seed="${seed}"/><feColorMatrix values="1 0 0 0 0  1 0 0 0 0  1 0 0 0 0  0 0 0 0 1"/><feComponentTransfer><feFuncR type="linear" slope="${depth}" intercept="${0.5 - depth / 2}"/><feFuncG type="linear" slope="${depth}" intercept="${0.5 - depth / 2}"/><feFuncB type="linear" slope="${depth}" intercept="${0.5 - depth / 2}"/></feComponentTransfer></filter>`;

/** Every gradient and filter the drawings refer to by name. */
export const materials = svg`<defs>${gradients}
${surface('brushed', '.006 .4', 3, 9, 0.5)}${surface('mottled', '.045', 6, 4, 0.9)}${surface('wood', '.004 .09', 5, 12, 1.6)}${surface('fibrous', '.03 .5', 3, 5, 0.6)}${surface('speckled', '.6', 2, 8, 0.9)}
<filter id="blur-soft" x="-30%" y="-30%" width="160%" height="160%"><feGaussianBlur stdDeviation="12"/></filter><filter id="blur-wide" x="-50%" y="-50%" width="200%" height="200%"><feGaussianBlur stdDeviation="40"/></filter></defs>`;
