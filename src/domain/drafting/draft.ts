import Handlebars from 'handlebars/runtime';
import type { CaseRecord } from '../record/schema.ts';
import { registerHelpers } from './helpers.ts';
import type { Draft, DraftedSection, DraftedTable } from './sheet.ts';
import { breaksTable, implantsTable } from './tables.ts';
import { letters, notes, partials } from './templates.generated.js';
import { type Tracked, track } from './track.ts';
import { tidy } from './words.ts';

/** What a template fills while it runs. */
interface Collector {
  tracked: Tracked;
  sections: DraftedSection[];
}

const engine = Handlebars.create();
registerHelpers(engine);

const collectorOf = (options: Handlebars.HelperOptions): Collector => options.data.collector;

engine.registerHelper(
  'section',
  function (this: unknown, id: string, heading: string, options: Handlebars.HelperOptions) {
    const { sections } = collectorOf(options);
    sections.push({ id, heading, statements: [] });
    options.fn(this);
    if (sections.at(-1)?.statements.length === 0) sections.pop();
    return '';
  },
);

engine.registerHelper('statement', function (this: unknown, ...given: unknown[]) {
  const options = given.at(-1) as Handlebars.HelperOptions;
  const [name, index] = given.slice(0, -1);
  const { tracked, sections } = collectorOf(options);
  const section = sections.at(-1);
  if (section === undefined) return '';
  const { value, reads } = tracked.during(() => tidy(options.fn(this)));
  const id = [section.id, String(name), ...(typeof index === 'number' ? [String(index + 1)] : [])].join('.');
  if (value !== '' && reads.length > 0) section.statements.push({ id, text: value, reads });
  return '';
});

const compile = (specs: Readonly<Record<string, TemplateSpecification>>) =>
  new Map(Object.entries(specs).map(([name, spec]) => [name, engine.template(spec)]));

for (const [name, partial] of compile(partials)) engine.registerPartial(name, partial);
const noteTemplates = compile(notes);
const letterTemplates = compile(letters);

/** Runs one template over a record. `extra` is what stands beside the record: who reads the letter, for example. */
const run = (
  template: Handlebars.TemplateDelegate | undefined,
  record: CaseRecord,
  extra: Readonly<Record<string, unknown>>,
): DraftedSection[] => {
  if (template === undefined) throw new RangeError('There is no such template');
  const collector: Collector = { tracked: track(record), sections: [] };
  // The stages are laid out one by one: a copy of the proxy would be read through, and everything would rest on everything.
  const { record: tracked } = collector.tracked;
  template(
    {
      who: tracked.who,
      before: tracked.before,
      anaesthesia: tracked.anaesthesia,
      breaks: tracked.breaks,
      buckle: tracked.buckle,
      vitreous: tracked.vitreous,
      drainage: tracked.drainage,
      retinopexy: tracked.retinopexy,
      tamponade: tracked.tamponade,
      endOfCase: tracked.endOfCase,
      aftercare: tracked.aftercare,
      ...extra,
    },
    { data: { collector } },
  );
  return collector.sections;
};

const present = (tables: readonly (DraftedTable | undefined)[]): DraftedTable[] =>
  tables.filter((table) => table !== undefined);

/** Drafts the operative note of a record, however little of it is filled in. */
export const draftNote = (record: CaseRecord): Draft => ({
  title: 'Operative note',
  sections: run(noteTemplates.get('operative-note'), record, {}),
  tables: present([breaksTable(record), implantsTable(record)]),
});

/** Drafts a letter from a template of that name. */
export const draftFrom = (
  name: string,
  title: string,
  record: CaseRecord,
  extra: Readonly<Record<string, unknown>> = {},
): Draft => ({ title, sections: run(letterTemplates.get(name), record, extra), tables: [] });
