/*
 * Errors of the database repeat the parameters of a query, and parameters hold patients. What is logged of an error is its kind, its code and
 * where it happened, never its message.
 */

const place = /^ {4}at .*:\d+:\d+\)?$/;

/**
 * @param {Error} error
 * @returns {string}
 */
const describe = (error) => {
  const places = (error.stack ?? '').split('\n').filter((line) => place.test(line));
  const code = 'code' in error && typeof error.code === 'string' ? ` ${error.code}` : '';
  const cause = error.cause instanceof Error ? `\ncaused by ${describe(error.cause)}` : '';
  return [`${error.name}${code}`, ...places].join('\n') + cause;
};

/**
 * @param {unknown} value an error, or a text that may hold one
 * @returns {string} without what the error says
 */
export const withoutMessage = (value) => {
  if (value instanceof Error) return describe(value);
  if (typeof value === 'object' && value !== null) return '(not logged)';
  const text = String(value);
  const places = text.split('\n').filter((line) => place.test(line));
  if (places.length === 0 && !text.includes('Failed query')) return text;
  return [/\b\w*Error\b/.exec(text)?.[0] ?? 'Error', ...places].join('\n');
};

/** @param {unknown} error */
export const saySafely = (error) => {
  process.stderr.write(`${withoutMessage(error)}\n`);
};

/** Makes whatever the framework reports by itself go the same way. */
export const quietErrors = () => {
  console.error = (...values) => {
    process.stderr.write(`${values.map(withoutMessage).join(' ')}\n`);
  };
  console.warn = console.error;
  process.removeAllListeners('unhandledRejection');
  process.on('unhandledRejection', saySafely);
};
