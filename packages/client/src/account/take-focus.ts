/** A ref for what takes the place of the control just used: reading and typing go on there. */
export const takeFocus = (element: HTMLElement | null): void => element?.focus();
