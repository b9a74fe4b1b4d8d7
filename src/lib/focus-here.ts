/** A `ref` for the field in which a dialog begins; without one the focus goes to its first button. */
export function focusHere(element: HTMLElement | null): void {
  element?.focus();
}
