/** Cautions by what a class is made of; a lot shows those of its classes. */
export const boardHazards =
  'Boards hold brominated flame retardants, and older solder holds lead. Do not burn or heat them.';
export const relayHazards = `${boardHazards} Relays and tilt switches may hold mercury.`;
export const phoneHazards = `${boardHazards} Phone boards ship without cells; a board with a cell on it must not ship.`;
export const edgeHazards = 'The base is board with brominated flame retardants. Do not burn or heat it.';
export const ceramicHazards =
  'Ceramic packages may hold beryllium oxide: do not crush, grind or drill them. Older lids are soldered with lead.';
export const packageHazards =
  'Packages hold brominated flame retardants, and older solder balls hold lead. Do not burn or grind them.';
export const pinHazards = 'Older solder on the tails holds lead; plastic bodies hold brominated flame retardants.';
