import type { RuleSet } from './rule-set';

const UPPER_CLASSES = ['extra', 'advanced', 'general'];
const ENTRY_CLASSES = ['technician', 'novice'];

/**
 * United States, 47 CFR part 97, 160 to 6 metres: as it stands since 2026-02-13, when 60 metres changed, with the five
 * channels before that day.
 *
 * Frequencies in kHz. Two bands that meet are kept apart because their emissions differ.
 */
export const US_97: RuleSet = {
  id: 'US-97',
  title: 'United States, 47 CFR part 97',
  kind: 'law',
  source:
    '47 CFR 97.301, 97.303, 97.305, 97.307 and 97.313 as in the eCFR of 2026-09-23 (amended 91 FR 1430)',
  textDate: '2026-09-23',
  // The 2.8 kHz limit that took the place of the symbol rate holds since then; the day is from memory.
  coversFrom: '2024-01-08',
  caution:
    'This is a reading of the rules, not the rules. They may have changed; your licence, and where and under whose rules you transmit, decide.',
  licenceClasses: ['extra', 'advanced', 'general', 'technician', 'novice'],
  regions: [1, 2, 3],
  anywhere: ['CW'],
  bands: [
    {
      band: '160 m',
      spans: [[1800, 2000]],
      classes: UPPER_CLASSES,
      regions: [2, 3],
      rule: '97.301(b)-(d)',
    },
    {
      band: '160 m',
      spans: [[1810, 1850]],
      classes: UPPER_CLASSES,
      regions: [1],
      rule: '97.301(b)-(d)',
    },
    { band: '80 m', spans: [[3500, 3600]], classes: ['extra'], rule: '97.301(b)' },
    {
      band: '80 m',
      spans: [[3525, 3600]],
      classes: ['advanced', 'general', 'technician', 'novice'],
      rule: '97.301(c)-(e)',
    },
    { band: '75 m', spans: [[3600, 4000]], classes: ['extra'], regions: [2], rule: '97.301(b)' },
    { band: '75 m', spans: [[3700, 4000]], classes: ['advanced'], regions: [2], rule: '97.301(c)' },
    { band: '75 m', spans: [[3800, 4000]], classes: ['general'], regions: [2], rule: '97.301(d)' },
    { band: '75 m', spans: [[3600, 3800]], classes: ['extra'], regions: [1], rule: '97.301(b)' },
    { band: '75 m', spans: [[3700, 3800]], classes: ['advanced'], regions: [1], rule: '97.301(c)' },
    { band: '75 m', spans: [[3600, 3900]], classes: ['extra'], regions: [3], rule: '97.301(b)' },
    { band: '75 m', spans: [[3700, 3900]], classes: ['advanced'], regions: [3], rule: '97.301(c)' },
    { band: '75 m', spans: [[3800, 3900]], classes: ['general'], regions: [3], rule: '97.301(d)' },
    {
      band: '60 m',
      spans: [[5351.5, 5366.5]],
      classes: UPPER_CLASSES,
      since: '2026-02-13',
      rule: '97.301(b)-(d)',
    },
    { band: '40 m', spans: [[7000, 7300]], classes: ['extra'], regions: [2], rule: '97.301(b)' },
    { band: '40 m', spans: [[7025, 7300]], classes: ['advanced'], regions: [2], rule: '97.301(c)' },
    {
      band: '40 m',
      spans: [
        [7025, 7125],
        [7175, 7300],
      ],
      classes: ['general'],
      regions: [2],
      rule: '97.301(d)',
    },
    { band: '40 m', spans: [[7025, 7125]], classes: ENTRY_CLASSES, rule: '97.301(e)' },
    { band: '40 m', spans: [[7000, 7200]], classes: ['extra'], regions: [1, 3], rule: '97.301(b)' },
    { band: '40 m', spans: [[7025, 7200]], classes: ['advanced'], regions: [1, 3], rule: '97.301(c)' },
    {
      band: '40 m',
      spans: [
        [7025, 7125],
        [7175, 7200],
      ],
      classes: ['general'],
      regions: [1, 3],
      rule: '97.301(d)',
    },
    {
      band: '30 m',
      spans: [[10100, 10150]],
      classes: UPPER_CLASSES,
      rule: '97.301(b)-(d)',
    },
    { band: '20 m', spans: [[14000, 14350]], classes: ['extra'], rule: '97.301(b)' },
    {
      band: '20 m',
      spans: [
        [14025, 14150],
        [14175, 14350],
      ],
      classes: ['advanced'],
      rule: '97.301(c)',
    },
    {
      band: '20 m',
      spans: [
        [14025, 14150],
        [14225, 14350],
      ],
      classes: ['general'],
      rule: '97.301(d)',
    },
    {
      band: '17 m',
      spans: [[18068, 18168]],
      classes: UPPER_CLASSES,
      rule: '97.301(b)-(d)',
    },
    { band: '15 m', spans: [[21000, 21450]], classes: ['extra'], rule: '97.301(b)' },
    {
      band: '15 m',
      spans: [
        [21025, 21200],
        [21225, 21450],
      ],
      classes: ['advanced'],
      rule: '97.301(c)',
    },
    {
      band: '15 m',
      spans: [
        [21025, 21200],
        [21275, 21450],
      ],
      classes: ['general'],
      rule: '97.301(d)',
    },
    { band: '15 m', spans: [[21025, 21200]], classes: ENTRY_CLASSES, rule: '97.301(e)' },
    {
      band: '12 m',
      spans: [[24890, 24990]],
      classes: UPPER_CLASSES,
      rule: '97.301(b)-(d)',
    },
    {
      band: '10 m',
      spans: [[28000, 29700]],
      classes: UPPER_CLASSES,
      rule: '97.301(b)-(d)',
    },
    { band: '10 m', spans: [[28000, 28500]], classes: ENTRY_CLASSES, rule: '97.301(e)' },
    {
      band: '6 m',
      spans: [[50000, 54000]],
      classes: ['extra', 'advanced', 'general', 'technician'],
      regions: [2, 3],
      rule: '97.301(a)',
    },
  ],
  segments: [
    {
      span: [1800, 2000],
      emissions: ['RTTY', 'data'],
      widestHertz: 2800,
      rule: '97.305(c)(2)(iii); 97.307(f)(3)',
    },
    { span: [1800, 2000], emissions: ['phone', 'image'], rule: '97.305(c)(2)(iv)' },
    {
      span: [3500, 3600],
      emissions: ['RTTY', 'data'],
      widestHertz: 2800,
      rule: '97.305(c)(3)(i); 97.307(f)(3)',
    },
    { span: [3600, 4000], emissions: ['phone', 'image'], rule: '97.305(c)(3)(ii)' },
    {
      span: [5351.5, 5366.5],
      emissions: ['phone', 'RTTY', 'data'],
      widestHertz: 2800,
      since: '2026-02-13',
      rule: '97.305(c)(3)(iii); 97.307(f)(14)',
    },
    {
      span: [7000, 7100],
      emissions: ['RTTY', 'data'],
      widestHertz: 2800,
      rule: '97.305(c)(3)(iv); 97.307(f)(3)',
    },
    // In Region 2 only west of 130° W or south of 20° N: not offered here.
    {
      span: [7075, 7100],
      emissions: ['phone', 'image'],
      regions: [1, 3],
      rule: '97.305(c)(3)(v); 97.307(f)(11)',
    },
    {
      span: [7100, 7125],
      emissions: ['RTTY', 'data'],
      widestHertz: 2800,
      rule: '97.305(c)(3)(vi); 97.307(f)(3)',
    },
    { span: [7125, 7300], emissions: ['phone', 'image'], rule: '97.305(c)(3)(vii)' },
    {
      span: [10100, 10150],
      emissions: ['RTTY', 'data'],
      widestHertz: 2800,
      rule: '97.305(c)(3)(viii); 97.307(f)(3)',
    },
    {
      span: [14000, 14150],
      emissions: ['RTTY', 'data'],
      widestHertz: 2800,
      rule: '97.305(c)(3)(ix); 97.307(f)(3)',
    },
    { span: [14150, 14350], emissions: ['phone', 'image'], rule: '97.305(c)(3)(x)' },
    {
      span: [18068, 18110],
      emissions: ['RTTY', 'data'],
      widestHertz: 2800,
      rule: '97.305(c)(3)(xi); 97.307(f)(3)',
    },
    { span: [18110, 18168], emissions: ['phone', 'image'], rule: '97.305(c)(3)(xii)' },
    {
      span: [21000, 21200],
      emissions: ['RTTY', 'data'],
      widestHertz: 2800,
      rule: '97.305(c)(3)(xiii); 97.307(f)(3)',
    },
    { span: [21200, 21450], emissions: ['phone', 'image'], rule: '97.305(c)(3)(xiv)' },
    {
      span: [24890, 24930],
      emissions: ['RTTY', 'data'],
      widestHertz: 2800,
      rule: '97.305(c)(3)(xv); 97.307(f)(3)',
    },
    { span: [24930, 24990], emissions: ['phone', 'image'], rule: '97.305(c)(3)(xvi)' },
    {
      span: [28000, 28300],
      emissions: ['RTTY', 'data'],
      widestHertz: 2800,
      rule: '97.305(c)(3)(xvii); 97.307(f)(3)',
    },
    { span: [28300, 28500], emissions: ['phone', 'image'], rule: '97.305(c)(3)(xviii)' },
    { span: [28500, 29000], emissions: ['phone', 'image'], rule: '97.305(c)(3)(xix)' },
    { span: [29000, 29700], emissions: ['phone', 'image'], rule: '97.305(c)(3)(xx)' },
    { span: [50100, 51000], emissions: ['MCW', 'phone', 'image', 'RTTY', 'data'], rule: '97.305(c)(4)(i)' },
    {
      span: [51000, 54000],
      emissions: ['MCW', 'phone', 'image', 'RTTY', 'data', 'test'],
      rule: '97.305(c)(4)(ii)',
    },
  ],
  classLimits: [
    { classes: ENTRY_CLASSES, span: [3525, 3600], only: ['CW'], rule: '97.307(f)(9)' },
    { classes: ENTRY_CLASSES, span: [7025, 7125], only: ['CW'], rule: '97.307(f)(9)' },
    { classes: ENTRY_CLASSES, span: [21025, 21200], only: ['CW'], rule: '97.307(f)(9)' },
    { classes: ENTRY_CLASSES, span: [28300, 28500], only: ['CW', 'phone'], rule: '97.307(f)(10)' },
  ],
  channels: [
    {
      band: '60 m',
      centresKilohertz: [5332, 5348, 5373, 5405],
      widestHertz: 2800,
      classes: UPPER_CLASSES,
      emissions: ['CW', 'phone', 'RTTY', 'data'],
      erpWatts: 100,
      rule: '97.303(h)(3); 97.313(i)',
    },
    {
      band: '60 m',
      centresKilohertz: [5358.5],
      widestHertz: 2800,
      classes: UPPER_CLASSES,
      emissions: ['CW', 'phone', 'RTTY', 'data'],
      erpWatts: 100,
      until: '2026-02-13',
      rule: '97.303(h), before 2026-02-13',
    },
  ],
  power: [
    { span: [1800, 54000], peakWatts: 1500, rule: '97.313(b)' },
    { span: [10100, 10150], peakWatts: 200, rule: '97.313(c)(1)' },
    { span: [3525, 3600], classes: ENTRY_CLASSES, peakWatts: 200, rule: '97.313(c)(2)' },
    { span: [7025, 7125], classes: ENTRY_CLASSES, peakWatts: 200, rule: '97.313(c)(2)' },
    { span: [21025, 21200], classes: ENTRY_CLASSES, peakWatts: 200, rule: '97.313(c)(2)' },
    { span: [28000, 28500], classes: ENTRY_CLASSES, peakWatts: 200, rule: '97.313(c)(2)' },
    { span: [7050, 7075], regions: [1, 3], peakWatts: 200, rule: '97.313(c)(3)' },
    { span: [5351.5, 5366.5], erpWatts: 9.15, since: '2026-02-13', rule: '97.313(i)' },
  ],
  notes: [
    { span: [1800, 54000], text: 'Use the least power that does the job.', rule: '97.313(a)' },
    { span: [5330, 5407], text: 'Secondary: others come first here.', rule: '97.303(h)' },
    {
      span: [7200, 7300],
      text: 'Must not disturb broadcasting meant for Regions 1 and 3.',
      rule: '97.303(i)',
    },
    { span: [10100, 10150], text: "Must not disturb other nations' fixed service.", rule: '97.303(j)' },
  ],
  spurious: { below30MHz: 'US below 30 MHz', from30MHz: 'US 30 to 225 MHz' },
};
