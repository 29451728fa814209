import { procedures } from '../../domain/record/procedures.ts';
import type { CaseRecord } from '../../domain/record/schema.ts';
import { showDate } from '../ui/entry.ts';
import { type SaveState, saveInWords } from './save-state.ts';
import { useDesk } from './use-desk.ts';

type Who = NonNullable<CaseRecord['who']>;

/** Whole years on a day; dates are YYYY-MM-DD. */
export const ageOn = (born: string, day: string): number =>
  Number(day.slice(0, 4)) - Number(born.slice(0, 4)) - (day.slice(5) < born.slice(5) ? 1 : 0);

const allergiesInWords = (patient: Who['patient']): string => {
  const allergies = patient?.allergies;
  if (allergies === undefined) return 'allergies not recorded';
  if (allergies === 'none') return 'no known allergies';
  return `allergic to ${allergies.map(({ substance }) => substance ?? 'something not named').join(', ')}`;
};

const operationInWords = (who: Who | undefined): string => {
  const listed = who?.performed ?? who?.planned ?? [];
  const text = listed.map((procedure) => procedures[procedure]).join(', ');
  return `${text.charAt(0).toUpperCase()}${text.slice(1)}`;
};

interface Props {
  revision: number;
  save: SaveState;
  /** Today, YYYY-MM-DD, for the age of a patient whose operation has no date yet. */
  today: string;
  signed: boolean;
  /** Where the revisions of this case are compared. */
  history: string;
}

/** Who lies there, which eye, and how the record stands. Always in view. */
export const PatientBar = ({ revision, save, today, signed, history }: Props) => {
  const who = useDesk((state) => state.record.who);
  const patient = who?.patient;
  const name = [patient?.familyName, patient?.givenName].filter((part) => part !== undefined).join(', ');
  const born = patient?.dateOfBirth;
  const facts = [
    born === undefined
      ? 'date of birth not recorded'
      : `born ${showDate(born)} (${ageOn(born, who?.startedAt ?? today)})`,
    patient?.number,
    allergiesInWords(patient),
  ].filter((part) => part !== undefined);
  return (
    <header className="patient-bar">
      <h1>{name === '' ? 'No name yet' : name}</h1>
      <strong className="eye">{who?.eye === undefined ? 'Eye not recorded' : `${who.eye} eye`}</strong>
      <span>{facts.join(' · ')}</span>
      <span className="patient-operation" title={operationInWords(who)}>
        {operationInWords(who)}
      </span>
      <span className="patient-save" data-save={save.kind} suppressHydrationWarning>
        {signed ? 'Signed' : `Draft, revision ${revision} · ${saveInWords(save)}`}{' '}
        <a href={history} className="no-print">
          history
        </a>
      </span>
    </header>
  );
};
