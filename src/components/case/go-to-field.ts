import type { FieldPath } from '../../domain/record/paths.ts';
import type { Stage } from '../../domain/record/schema.ts';
import type { DeskStore } from './desk-store.ts';
import { fieldsInOrder, groupsHiding } from './field-order.ts';
import { focusSoon } from './focus-field.ts';

/** Opens whatever hides a field, and puts the focus into it. */
export const goToField = (store: DeskStore, path: FieldPath): void => {
  store.reveal(path, groupsHiding(path));
  focusSoon(path);
};

/** Opens a stage at its first field. */
export const goToStage = (store: DeskStore, stage: Stage): void => {
  store.goTo(stage);
  const first = fieldsInOrder(store.get().record).find((path) => path.startsWith(`${stage}.`));
  if (first !== undefined) focusSoon(first);
};
