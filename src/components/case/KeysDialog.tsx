import { Dialog } from '../ui/Dialog.tsx';
import { pageKeys } from './page-keys.ts';

const inFields: readonly (readonly [string, string])[] = [
  ['Enter', 'on to the next field'],
  ['← →, a … z', 'choose in a row of buttons, by arrow or first letter'],
  ['Delete', 'make a row of buttons empty again'],
  ['Esc', 'leave the field, so that single keys work'],
  ['Ctrl+Z, Ctrl+Y', 'undo, redo'],
  ['today, now', 'in a date or time'],
];

/** All keys of the page, as they are printed on it. */
export const KeysDialog = ({ onClose }: { onClose: () => void }) => (
  <Dialog title="Keys" onClose={onClose}>
    <p className="mb-3">Alone where nothing is being written; with Alt from anywhere.</p>
    <dl className="keys-list">
      {pageKeys.map(({ printed, does }) => (
        <div key={printed}>
          <dt>
            <kbd className="key">{printed}</kbd>
          </dt>
          <dd>{does}</dd>
        </div>
      ))}
    </dl>
    <h3 className="mt-4 mb-2">In the fields</h3>
    <dl className="keys-list">
      {inFields.map(([printed, does]) => (
        <div key={printed}>
          <dt>
            <kbd className="key">{printed}</kbd>
          </dt>
          <dd>{does}</dd>
        </div>
      ))}
    </dl>
  </Dialog>
);
