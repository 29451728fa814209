import type { FieldPath } from '../../domain/record/paths.ts';

const focusable = 'input:checked, input:not(:disabled), select, textarea, button:not(:disabled)';

const elementFor = (path: FieldPath): HTMLElement | null => {
  const keys = path.split('.');
  for (let length = keys.length; length > 0; length -= 1) {
    const found = document.getElementById(keys.slice(0, length).join('.'));
    if (found !== null) return found;
  }
  return null;
};

/** Puts the focus into a field, or into the nearest thing around it that is on the page. */
export const focusField = (path: FieldPath): void => {
  const element = elementFor(path);
  if (element === null) return;
  const checked = element.querySelector<HTMLElement>('input:checked');
  const target = element.matches('input, select, textarea, button')
    ? element
    : (checked ?? element.querySelector<HTMLElement>(focusable));
  target?.focus();
  target?.scrollIntoView({ block: 'nearest' });
};

/** The same, once the page shows what has just been changed. */
export const focusSoon = (path: FieldPath): void => {
  requestAnimationFrame(() => requestAnimationFrame(() => focusField(path)));
};
