import { samplesOf } from './sample.ts';

export const material = samplesOf('material', {
  buckleLeft: {
    faults: [
      'The band was fixed with 5-0 [[polyester]] mattress sutures.',
      'Sutures: [[polyglactin]] 5-0, one in each quadrant.',
      'Fixed with [[polypropylene]].',
      'A silicone [[sponge]] was placed round the eye.',
      'The ends were joined with a [[clip]].',
      'The ends of the band were tied with a [[clove hitch]].',
      'The band was held in four [[scleral tunnels]].',
      'Conjunctiva closed with [[fibrin glue]].',
      'The ends were joined by a [[suture]].',
      'Band fixed with [[polydioxanone]] sutures.',
      'Conjunctival closure with [[plain gut]].',
      '[[Belt loops]] in the four quadrants held the 2.5 mm band.',
    ],
    clean: [
      'The band was fixed with 5-0 nylon mattress sutures.',
      'Ends joined with a silicone sleeve.',
      'A solid silicone band and tyre.',
      'Conjunctiva closed with polyglactin 910.',
      'Nylon 5-0, sleeve, polyglactin to conj.',
    ],
    traps: [
      'Silk traction sutures were placed under the recti.',
      'A sponge swab was used to dry the sclera.',
      'Cotton buds and a sponge on a stick.',
      'Polyester would have been an alternative.',
      'The drape was held with a clip.',
      'No sponge was used.',
      'The tunnel vision he had noticed has gone.',
      'In the fellow eye a sponge might do.',
    ],
  },
  combinedRight: {
    faults: [
      'The band was secured with [[nylon mattress sutures]].',
      'The ends were held with a silicone [[sleeve]].',
      'A [[sponge]] 4 mm wide was passed under the recti.',
      'EB in 4 quadrants with [[5-0 polyester mattress sutures]].',
      '[[Sleeve]] superotemporally.',
    ],
    clean: [
      'Belt loops in four quadrants, ends clipped.',
      'The band ran in scleral tunnels and was joined by a metal clip.',
      'Conj closed with polyglactin.',
      'Sclerotomies were sutured with polyglactin 8-0.',
    ],
    traps: [
      '10-0 nylon to the corneal wound.',
      'Acrylic one-piece IOL in the bag.',
      'A merocel sponge was used for the corneal surface.',
    ],
  },
  dialysisLeft: {
    faults: [
      'A segment of [[solid silicone]] was sewn on.',
      'A [[tyre]] segment from 3 to 6 o’clock.',
      '5-0 [[nylon]] mattress sutures held the sponge.',
      'The [[round]] sponge was fixed with polyester.',
      'Sponge fixed with [[polypropylene]] 5-0.',
      'Held in a [[scleral tunnel]].',
    ],
    clean: [
      'An oval silicone sponge was sewn on with 5-0 polyester.',
      'Polyester mattress sutures × 2.',
      'Sponge segment, 3–6 o’clock.',
    ],
    traps: [
      'Nylon 10-0 was ready but not needed.',
      'A solid silicone tyre was considered.',
      'Retinal band keratopathy: none.',
    ],
  },
  oilLeft: {
    faults: [
      '[[5000]] cSt silicone oil was used.',
      'Silicone oil [[1,300 cSt]].',
      'Oil [[5,000]] centistokes.',
      'SiO [[5000cs]] fill.',
      'The dye was [[brilliant blue]].',
      'Membranes stained with [[triamcinolone]].',
    ],
    clean: [
      '1000 cSt silicone oil was used.',
      'Silicone oil 1,000 cSt.',
      'Oil, 1000 centistokes, 95% fill.',
      'Trypan blue stain, membranes peeled.',
    ],
    traps: [
      'A 5000 cSt oil might have lasted longer.',
      'Sub-Tenon triamcinolone at the end.',
      'The patient weighs 100 kg.',
    ],
  },
  giantLeft: {
    faults: ['[[Brilliant blue]] was used to see the hyaloid.', 'Dye: [[trypan blue]].'],
    clean: ['Triamcinolone was used to see the hyaloid.'],
    traps: ['Methylene blue marked the skin.'],
  },
});
