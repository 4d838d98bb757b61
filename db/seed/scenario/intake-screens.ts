import { heading, work, type DemoList } from './row';

/** Clean: every rule passes. */
export const intakeScreens: DemoList = {
  title: 'Millrace intake: new screens',
  subtitle: 'Oriel Pumpworks, issue A',
  sheet: 'Activities',
  header: ['No.', 'Activity', 'a (days)', 'm (days)', 'b (days)', 'Waits for'],
  rows: [
    work('S10', 'Instruction received', [0, 0, 0]),
    heading(null, 'Design and making'),
    work('S20', 'Measure the channel', [2, 3, 6], 'S10'),
    work('S30', 'Design screens', [8, 11, 18], 'S20'),
    work('S40', 'Design lifting frame', [5, 7, 13], 'S20'),
    work('S50', 'Make screens', [24, 30, 45], 'S30'),
    work('S60', 'Make lifting frame', [13, 18, 28], 'S40'),
    work('S70', 'Galvanise', [4, 6, 12], 'S50, S60'),
    heading(null, 'Site'),
    work('S80', 'Stop logs and dewatering', [3, 5, 9], 'S20 FS+12'),
    work('S90', 'Break out old sills', [6, 8, 14], 'S80'),
    work('S100', 'Cast new sills', [7, 9, 15], 'S90'),
    work('S110', 'Sills gain strength', [12, 14, 17], 'S100'),
    work('S120', 'Deliver and offload', [1, 2, 4], 'S70'),
    work('S130', 'Set screens', [5, 7, 12], 'S110, S120'),
    work('S140', 'Set lifting frame', [3, 4, 8], 'S120, S130 SS+2'),
    work('S150', 'Electrical connections', [4, 6, 11], 'S140'),
    work('S160', 'Refill and prove', [3, 5, 10], 'S130, S150'),
    work('S170', 'Hand back the channel', [0, 0, 0], 'S160'),
  ],
  foot: [],
};
