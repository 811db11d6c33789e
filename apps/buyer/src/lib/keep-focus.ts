import type { MouseEvent } from 'react';

/**
 * For the mouse's press on a button below a field. Leaving the field can bring up its error and push the button away from
 * under the pointer, and then the press would be lost; so the field is not left until the press is done.
 */
export const keepFocus = (event: MouseEvent): void => event.preventDefault();
