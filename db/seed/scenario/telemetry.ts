import { work, type DemoList, type DemoRow } from './row';

const header = ['Task', 'Task name', 'Best', 'Likely', 'Worst', 'Depends on'] as const;

const shared: readonly DemoRow[] = [
  work('1', 'Kick-off', [0, 0, 0]),
  work('2', 'Survey of outstations', [8, 10, 16], '1'),
  work('3', 'Choose radio band', [4, 5, 10], '1'),
  work('4', 'Design cabinet', [7, 9, 14], '2'),
  work('5', 'Build first cabinet', [9, 12, 20], '4'),
];

/** Rev 0: a handful of defects, each of which can be mended. */
export const telemetryRev0: DemoList = {
  title: '',
  subtitle: '',
  sheet: 'telemetry',
  header,
  rows: [
    ...shared,
    work('6', 'Licence for the radio band', [20, 15, 35], '3'),
    work('7', 'Bench test', [3, 4, 9], '5, 3'),
    work('8', 'Build remaining cabinets', [22, 28, 20], '7'),
    work('9', 'Install, north district', [14, 18, 27], '8; 6'),
    work('10', 'Install, south district', [11, 15, 26], '9 SS+5'),
    work('11', 'Change over control room', [5, 6, 13], '9, 1O'),
    work('12', 'Run in parallel', [10, 10, 10], '11'),
    work('13', 'Remove old sets', [6, 8, 15], '11'),
    work('14', 'Acceptance', [0, 0, 0], '12'),
  ],
  foot: [],
};

/** Rev 1: what was asked is mostly done; one estimate came back otherwise, and one thing changed unasked. */
export const telemetryRev1: DemoList = {
  title: '',
  subtitle: '',
  sheet: 'telemetry',
  header,
  rows: [
    ...shared,
    work('6', 'Licence for the radio band', [15, 20, 35], '3'),
    work('7', 'Bench test', [3, 4, 9], '5, 3'),
    work('8', 'Build remaining cabinets', [20, 24, 31], '7'),
    work('9', 'Install, north district', [14, 21, 33], '8; 6'),
    work('10', 'Install, south district', [11, 15, 26], '9 SS+5'),
    work('11', 'Change over control room', [5, 6, 13], '9, 10'),
    work('12', 'Run in parallel', [10, 10, 10], '11'),
    work('13', 'Remove old sets', [6, 8, 15], '11'),
    work('14', 'Acceptance', [0, 0, 0], '12, 13'),
  ],
  foot: [],
};
