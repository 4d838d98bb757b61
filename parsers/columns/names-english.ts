import type { NameEntry } from './names';

/** English, as found in contractors' lists. */
export const ENGLISH: readonly NameEntry[] = [
  [
    'id',
    1,
    'id|ids|activity id|activity ids|act id|activity identifier|task id|task identifier|item id|identifier|unique id|' +
      'unique identifier|activity code|act code|task code|activity no|activity number|activity num|act no|act number|' +
      'task no|task number|task num|operation id|operation no|job id|job no|job number|step id|work item id|uid|event id|' +
      'work package id|wp id|process id|node id|activity ref|activity reference|task ref|id no|id code|id number',
  ],
  [
    'id',
    0.9,
    'code|ref|reference|ref no|reference no|item no|item number|step no|event no|line id|key|tag|designator|symbol',
  ],
  [
    'id',
    0.75,
    'no|nr|number|num|s no|sl no|sr no|serial no|line no|line|row no|seq|sequence|pos|position|letter|label|node',
  ],
  [
    'id',
    0.6,
    'activity|task|job|operation|item|step|event|work package|work item|element|process|act|activities|tasks|work|stage',
  ],
  [
    'name',
    1,
    'name|activity name|act name|task name|description|activity description|act description|act desc|task description|' +
      'activity desc|task desc|desc|job description|item description|work description|description of work|' +
      'description of works|description of activity|title|activity title|task title|operation name|operation description|job name|item name',
  ],
  [
    'name',
    0.8,
    'activity|task|operation|job|work item|activities|tasks|what|scope|scope of work|work|works|process|step|item|event|work package|element|stage',
  ],
  ['name', 0.5, 'details|label|text|subject|deliverable'],
  [
    'optimistic',
    1,
    'optimistic|optimistic time|optimistic duration|optimistic estimate|opt|optim|best case|best|minimum|min|lowest|shortest|' +
      'earliest duration|min dur|min duration|minimum duration|minimum time|shortest time|best case duration|optimistic a|' +
      'a optimistic|a opt|a min|opt a|optimistic to|optimistic ta|to optimistic|optimistic o|o optimistic|opt dur|opt duration|opt time',
  ],
  ['optimistic', 0.9, 'low|lower|short|fast|fastest|quickest|lo|low estimate|best estimate of three|crash'],
  [
    'likely',
    1,
    'most likely|likely|most likely time|most likely duration|most likely estimate|likely duration|likely time|most probable|' +
      'probable|most probable time|most probable duration|probable duration|ml|most likely m|m most likely|m likely|m ml|' +
      'mostlikely|mode|modal|most likely tm|tm most likely|most likely ml|probable time|likeliest|realistic|realistic duration|' +
      'realistic time|ml dur|ml duration|m probable|m mode|likely m|realistic m|m realistic|normal m|m normal',
  ],
  [
    'likely',
    0.9,
    'normal|normal time|normal duration|typical|middle|mid|medium|nominal|best guess|moderate|standard',
  ],
  [
    'pessimistic',
    1,
    'pessimistic|pessimistic time|pessimistic duration|pessimistic estimate|pess|pessim|worst case|worst|maximum|max|highest|' +
      'longest|max dur|max duration|maximum duration|maximum time|longest time|worst case duration|pessimistic b|' +
      'b pessimistic|b pess|b max|pess b|pessimistic tp|pessimistic tb|tp pessimistic|pessimistic p|p pessimistic|pess dur|' +
      'pess duration|pess time|pes',
  ],
  ['pessimistic', 0.9, 'high|upper|long|slow|slowest|hi|high estimate'],
  [
    'duration',
    1,
    'duration|dur|durations|activity duration|task duration|original duration|orig dur|orig duration|planned duration|' +
      'estimated duration|duration estimate|est duration|est dur|od|working days|work days|workdays|days|activity time|time required|' +
      'planned dur|job duration|d days|t days',
  ],
  [
    'duration',
    0.8,
    'time|length|weeks|hours|period|estimate|time estimate|estimated time|activity length|d|completion time',
  ],
  ['duration', 0.6, 'expected|expected duration|expected time|expected value|te|mean|mean duration|average'],
  [
    'predecessors',
    1,
    'predecessors|predecessor|preds|pred|predec|predecessor id|predecessor ids|predecessor s|pred id|pred ids|immediate predecessor|' +
      'immediate predecessors|immediate pred|immediate preds|immediate predecessor s|imm pred|imm preds|ipa|preceding activity|preceding activities|preceding|' +
      'preceded by|precedes from|preceding task|preceding tasks|depends on|depends upon|dependency|dependencies|dependent on|dependence|dependencies on|' +
      'after|waits for|waits on|wait for|follows|follows on|following from|start after|starts after|begins after|prerequisite|prerequisites|prereq|' +
      'prereqs|predecessor activity|predecessor activities|predecessor task|predecessor tasks|predecessors id|prior activity|' +
      'prior activities|previous activity|previous activities|needs|requires|immediate predecessor activity|immediate predecessor activities|' +
      'predecessor code|predecessors code|must follow|depends|dep on|comes after|after activity|after activities|after task',
  ],
  [
    'predecessors',
    0.85,
    'precedence|precedents|logic|links|prior|previous|predecessor list|predecessor details|predecessors details|dep|deps',
  ],
  [
    'successors',
    1,
    'successors|successor|succs|succ|successor s|successor id|successor ids|immediate successor|immediate successors|imm succ|' +
      'succeeding activity|succeeding activities|succeeding|succeeded by|followed by|precedes|successor activity|successor activities|' +
      'successor task|successor tasks|leads to|following activity|following activities|next activity|next activities|needed by|required by|goes before',
  ],
  ['successors', 0.8, 'next|feeds|enables|successor details'],
  [
    'relation',
    1,
    'relation|relationship|relationship type|rel|rel type|relation type|link type|dependency type|type of link|type of relation|' +
      'type of relationship|type of dependency|predecessor type|pred type|logic type|link relation|connection|constraint fs ss ff sf|relations|relationships',
  ],
  ['relation', 0.6, 'type|link|kind'],
  [
    'lag',
    1,
    'lag|lags|lead lag|lag lead|lag time|lag duration|lag value|pred lag|predecessor lag|lag or lead|lead or lag|lead and lag|link lag|relationship lag|lag days',
  ],
  ['lag', 0.7, 'offset|delay|lead|wait|lead time'],
  [
    'wbs',
    1,
    'wbs|wbs code|wbs id|wbs no|wbs number|wbs path|wbs element|work breakdown|work breakdown structure|outline number|outline no|outline code',
  ],
  ['wbs', 0.8, 'outline|section|phase|hierarchy|work package no|work package code'],
  ['calendar', 1, 'calendar|calendar name|calendar id|work calendar|working calendar|cal'],
  [
    'resource',
    1,
    'resource|resources|resource name|resource names|resource id|resource ids|crew|crews|gang|gangs|labour|labor|plant',
  ],
  ['resource', 0.7, 'team|trade|trades|staff'],
  [
    'responsible',
    1,
    'responsible|responsibility|responsible party|responsible person|owner|activity owner|task owner|assigned to|assignee|assigned|foreman|supervisor|person in charge|in charge|pic',
  ],
  ['responsible', 0.7, 'contractor|subcontractor|discipline|by|who|department|party|company|manager'],
  [
    'start',
    1,
    'start|start date|planned start|scheduled start|plan start|starts|begin|begin date|start on|planned start date|current start|forecast start|target start',
  ],
  ['start', 0.8, 'early start|es|earliest start|baseline start|bl start|proposed start|early start date'],
  [
    'finish',
    1,
    'finish|finish date|end|end date|planned finish|scheduled finish|plan finish|finishes|planned end|scheduled end|completion|completion date|planned finish date|due|due date|current finish|forecast finish|target finish',
  ],
  [
    'finish',
    0.8,
    'early finish|ef|earliest finish|baseline finish|bl finish|proposed finish|early finish date|deadline',
  ],
  ['totalFloat', 1, 'total float|float|tf|total slack|slack|float total|stated float|total float tf'],
  [
    'critical',
    1,
    'critical|crit|is critical|critical y n|on critical path|critical path|critical activity|cp',
  ],
  [
    'percentComplete',
    1,
    'percent complete|percent|percent done|pct complete|pct|complete|progress|physical percent complete|percent progress|activity percent complete|duration percent complete|status percent|percentage complete|percentage',
  ],
  ['actualStart', 1, 'actual start|act start|actual start date|as|started|started on|actual start as'],
  [
    'actualFinish',
    1,
    'actual finish|act finish|actual finish date|actual end|actual end date|af|finished|finished on|completed on|actual completion',
  ],
  [
    'remaining',
    1,
    'remaining duration|remaining|rem dur|rd|remaining dur|rem duration|duration remaining|to go|remaining time|rem',
  ],
  [
    'constraintKind',
    1,
    'constraint|constraint type|constraints|constraint kind|primary constraint|type of constraint',
  ],
  ['constraintDate', 1, 'constraint date|date of constraint|primary constraint date'],
  [
    'notes',
    1,
    'notes|note|comments|comment|remarks|remark|observations|assumptions|basis|basis of estimate|memo|annotation',
  ],
];
