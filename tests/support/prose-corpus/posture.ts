import { samplesOf } from './sample.ts';

export const posture = samplesOf('posture', {
  gasRight: {
    faults: [
      'Posture [[face down]] for 5 days.',
      'Please lie on your [[right side]] for 50 minutes in each hour.',
      'She is to sit [[upright]] for five days.',
      'Posture: [[right side]].',
      '[[Face-down]] posturing advised.',
      'She should keep [[face down]] for 50 minutes an hour.',
      '[[No posture]] needed.',
      'Lie [[flat on the back]] for 5 days.',
      'To posture [[R side]], 50 min/h.',
      '[[Prone]] posture 5/7.',
      'After the operation she went to the ward lying on her [[right side]], and was told to keep to it for five days.',
      'No [[posturing is required]].',
    ],
    clean: [
      'Posture: left side, 50 min/h, 5 days.',
      'Please lie on your left side for 50 minutes in each hour.',
      'Left side down, 5/7.',
      'Posturing on the left side for five days.',
      'L side posture.',
      'She is to lie on her left side.',
    ],
    traps: [
      'She was supine for the operation.',
      'She should not lie on her back.',
      'Avoid lying face down.',
      'If the tear had been posterior she would have been asked to lie face down.',
      'The drape was put face down on the tray.',
      'An upright piano is no good for posture.',
      'After 5 days she may sleep as she likes.',
      'Face washing is allowed with the eye shut.',
      'She sat upright at the slit lamp.',
      'Face-down posture was used after her macular hole operation in the left eye.',
    ],
  },
  oilLeft: {
    faults: [
      'Posture: [[upright]].',
      'He should lie on his [[left side]] for a week.',
      'To sit [[upright]] with the head still for 7 days.',
      '[[No posturing]] needed.',
      'Posture [[right cheek]] to pillow for a week.',
      'Please [[sit up]] for 45 minutes of each hour for a week.',
    ],
    clean: [
      'Posture: face down, 45 min/h, 7 days.',
      'Face down for a week.',
      'Prone posture 1/52.',
      'He is to keep face-down for seven days.',
    ],
    traps: [
      'Not to lie on the back.',
      'He postured upright in November.',
      'Head-up tilt during anaesthesia.',
    ],
  },
  buckleLeft: {
    faults: [
      '[[Face down]] posture for three days.',
      'Lie on the [[left side]] for five days.',
      'Posture [[upright]] 1/52.',
    ],
    clean: ['No posture needed.', 'Free position.', 'He need not posture.', 'No posturing.'],
    traps: [
      'If gas is needed later he would have to posture upright.',
      'He likes to sleep face down and may do so.',
      'Sitting upright, the disc was seen.',
    ],
  },
  pneumaticRight: {
    faults: [
      'Posture [[face down]].',
      'She should lie on the [[left side]] for six days.',
      'Strict [[prone]] positioning 6/7.',
      '[[R side]] posture for 6 days.',
    ],
    clean: [
      'Posture upright, 50 min/h, 6 days.',
      'She is to sit upright for six days.',
      'Head upright, also at night.',
    ],
    traps: ['She lay on her back for the injection.', 'Never flat on your back while the gas is in.'],
  },
  combinedRight: {
    faults: [
      '[[Upright]] posture for 3 days.',
      'Lie on [[left side]] for three days.',
      'Posture: [[right cheek]] down.',
    ],
    clean: ['Face down for three days.', 'FD posture 3/7, 50 min/h.', 'Nose down for 3 days.'],
    traps: ['Thereafter upright or on either side as he likes.'],
  },
  giantLeft: {
    faults: [
      'Posture [[left side]] for 10 days.',
      '[[Face down]], 10 days.',
      'He must lie on the [[left]] side for ten days.',
    ],
    clean: ['Posture right side for 10 days.', 'R side, 45 min/h, 10/7.'],
    traps: ['Do not lie on the left side.', 'Supine on the table.'],
  },
});
