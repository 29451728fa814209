import { defineRule } from '../../define-rule.ts';
import { breaksOf } from '../../facts.ts';

export const rule = defineRule({
  id: 'break-unsupported',
  family: 'buckle',
  level: 'omission',
  title: 'A break that no element supports and no tamponade closes',
  why: 'An open break detaches the retina again.',
  source: { text: 'Trade practice', certainty: 'P' },
  answerable: true,
  check: (record) => {
    const elements = record.buckle?.elements;
    if (
      !Array.isArray(elements) ||
      (record.tamponade?.agent !== undefined && record.tamponade.agent !== 'none')
    )
      return [];
    if (record.tamponade?.agent === undefined) return [];
    // Heavy liquid left in the eye closes a break for a while.
    const liquid = record.vitreous?.heavyLiquid;
    if (liquid === 'left' || liquid === 'not-removed') return [];
    return breaksOf(record).flatMap(({ supportedByElements, onDetachedRetina, kind }, index) =>
      supportedByElements !== 'none' || onDetachedRetina === false || kind === 'macular-hole'
        ? []
        : [
            {
              fields: [`breaks.found.${index}.supportedByElements`, 'tamponade.agent'],
              message: `Break ${index + 1} is recorded as on no element, and there is no tamponade.`,
            },
          ],
    );
  },
  examples: {
    fires: [
      {
        name: 'off the buckle',
        fields: 'breaks.found.0.supportedByElements',
        record: {
          breaks: { found: [{ supportedByElements: 'none' }] },
          buckle: { elements: [{ role: 'segment' }] },
          tamponade: { agent: 'none' },
        },
      },
    ],
    silent: [
      {
        name: 'under gas',
        record: {
          breaks: { found: [{ supportedByElements: 'none' }] },
          buckle: { elements: [{ role: 'segment' }] },
          tamponade: { agent: 'SF6' },
        },
      },
    ],
    unknown: [
      {
        name: 'support not recorded',
        record: {
          breaks: { found: [{ clock: 4 }] },
          buckle: { elements: [{ role: 'segment' }] },
          tamponade: { agent: 'none' },
        },
      },
    ],
  },
});
