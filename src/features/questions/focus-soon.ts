/** Focuses a control that the next paint will have brought. */
export function focusSoon(id: string) {
  requestAnimationFrame(() => document.getElementById(id)?.focus());
}
