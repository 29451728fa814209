import { z } from 'zod';

/** What the form, the handbook and the JSON Schema say about a field besides its type. */
declare module 'zod' {
  interface GlobalMeta {
    /** Printed beside the value: mm, mL, %, mmHg, … */
    unit?: string;
    /** Label of each allowed value, in the order in which they are offered. */
    options?: Readonly<Record<string, string>>;
    /** One short sentence under the field. */
    help?: string;
    /** How a string is written: a date, a local date and time, or several lines. */
    entry?: 'date' | 'date-time' | 'long-text';
    /** Singular noun for one item of a list: "break", "element". */
    item?: string;
  }
}

type Options = Readonly<Record<string, string>>;

const keysOf = <const T extends Options>(options: T) => Object.keys(options) as [keyof T & string];

/** One of a closed set of values. */
export const choice = <const T extends Options>(title: string, options: T) =>
  z.enum(keysOf(options)).meta({ title, options });

/** Any number of a closed set of values, none twice. */
export const choices = <const T extends Options>(title: string, options: T) =>
  z
    .array(z.enum(keysOf(options)))
    .refine((values) => new Set(values).size === values.length, 'Each may be named once')
    .meta({ title, options });

/** A measured quantity. The bounds are those of a slip of the keyboard; what is merely unlikely is for the checks. */
export const quantity = (title: string, unit: string, min: number, max: number) =>
  z.number().min(min).max(max).meta({ title, unit });

/** A whole number of things. */
export const count = (title: string, max: number, unit?: string) =>
  z
    .int()
    .min(0)
    .max(max)
    .meta({ title, ...(unit === undefined ? {} : { unit }) });

export const yesNo = (title: string) => z.boolean().meta({ title });

const shortText = z.string().trim().min(1).max(200);

export const text = (title: string) => shortText.meta({ title });

export const longText = (title: string) =>
  z.string().trim().min(1).max(4000).meta({ title, entry: 'long-text' });

const isCalendarDate = (value: string) => {
  const [year = 0, month = 0, day = 0] = value.slice(0, 10).split('-').map(Number);
  const date = new Date(Date.UTC(year, month - 1, day));
  return date.getUTCFullYear() === year && date.getUTCMonth() === month - 1 && date.getUTCDate() === day;
};

/** A calendar day, YYYY-MM-DD. */
export const date = (title: string) =>
  z
    .string()
    .regex(/^\d{4}-\d{2}-\d{2}$/, 'Write the date as YYYY-MM-DD')
    .refine(isCalendarDate, 'There is no such day in the calendar')
    .meta({ title, entry: 'date', format: 'date' });

/** A local time at the unit, YYYY-MM-DDTHH:MM. */
export const dateTime = (title: string) =>
  z
    .string()
    .regex(/^\d{4}-\d{2}-\d{2}T([01]\d|2[0-3]):[0-5]\d$/, 'Write date and time as YYYY-MM-DDTHH:MM')
    .refine(isCalendarDate, 'There is no such day in the calendar')
    .meta({ title, entry: 'date-time' });

/** A position on the clock as the surgeon sees it: 1 up to but not including 13, so that half past twelve is 12.5. */
export const clockHour = (title: string) =>
  z.number().min(1).lt(13).multipleOf(0.25).meta({ title, unit: 'o’clock' });

/** A group of fields, each of which may be absent. Unknown names are refused, so that a slip is not lost in silence. */
export const group = <const T extends z.core.$ZodLooseShape>(title: string, shape: T) =>
  z.strictObject(shape).partial().meta({ title });

/** A list that tells "there were none" from "nobody has said". */
export const listOrNone = <T extends z.ZodType>(title: string, item: string, schema: T) =>
  z.union([z.literal('none'), z.array(schema).min(1).max(40)]).meta({ title, item });

/** A field that may not apply to this case, which is something else than being absent. */
export const orNotApplicable = <T extends z.ZodType>(schema: T) =>
  z.union([z.literal('not-applicable'), schema]).meta(schema.meta() ?? {});

export const quadrants = {
  superotemporal: 'superotemporal',
  superonasal: 'superonasal',
  inferonasal: 'inferonasal',
  inferotemporal: 'inferotemporal',
} as const;

export const sides = { right: 'right eye', left: 'left eye' } as const;
