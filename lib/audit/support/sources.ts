/** Where the rules come from. */
export const GAO_LOGIC =
  'US GAO, Schedule Assessment Guide, GAO-16-89G (2015), best practice 2: sequencing all activities';
export const GAO_DURATIONS =
  'US GAO, Schedule Assessment Guide, GAO-16-89G (2015), best practice 4: establishing the duration of all activities';
export const GAO_RISK =
  'US GAO, Schedule Assessment Guide, GAO-16-89G (2015), best practice 8: conducting a schedule risk analysis';
export const DCMA_LOGIC =
  'DCMA, Earned Value Management System Program Analysis Pamphlet, PAM 200.1 (2012), section 4: missing logic';
export const THREE_POINTS =
  'Malcolm, Roseboom, Clark, Fazar, Application of a Technique for Research and Development Program Evaluation, Operations Research 7 (1959)';
export const PRACTICE = 'Common practice';
