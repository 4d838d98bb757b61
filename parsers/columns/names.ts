import type { Field } from '@/lib/schedule/field';

/**
 * What columns are called, folded (lower case, no accents), punctuation as blanks, `#` as `no`, units and
 * brackets taken off. The number is how surely a header of that name means the field; a name may stand
 * with several fields, and the cells then decide.
 */
export type NameEntry = readonly [field: Field, sureness: number, names: string];

/** English, as found in contractors' lists. */
const ENGLISH: readonly NameEntry[] = [
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
    'time|length|weeks|hours|period|estimate|time estimate|estimated time|expected duration|expected time|activity length|te|d|completion time|mean duration',
  ],
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

/** German, French, Spanish, Italian, Dutch, Portuguese. */
const OTHERS: readonly NameEntry[] = [
  [
    'id',
    1,
    'vorgangsnummer|vorgangs nr|vorgang nr|vorgangsnr|vorgang id|vorgangs id|kennung|kennziffer|aufgaben nr|vorgangscode',
  ],
  [
    'id',
    1,
    'id tache|no tache|numero de tache|code tache|code activite|id activite|numero d activite|identifiant|n tache|repere',
  ],
  [
    'id',
    1,
    'id tarea|id actividad|codigo|codigo actividad|codigo de actividad|n actividad|identificador|id attivita|codice|codice attivita|id activiteit|activiteitnr|taak id|taaknr|activiteit id|id da tarefa|id tarefa',
  ],
  ['id', 0.75, 'lfd nr|lfdnr|numero|nummer|cod|n'],
  [
    'id',
    0.6,
    'vorgang|aufgabe|tache|activite|actividad|tarea|attivita|activiteit|taak|atividade|tarefa|arbeitsgang',
  ],
  [
    'name',
    1,
    'bezeichnung|beschreibung|vorgangsname|vorgangsbezeichnung|benennung|designation|libelle|nom|nom de la tache|intitule|descripcion|nombre|nombre de la tarea|descrizione|nome|denominazione|omschrijving|naam|beschrijving|descricao|nome da tarefa|nombre de tarea',
  ],
  [
    'name',
    0.8,
    'vorgang|aufgabe|tache|activite|actividad|tarea|attivita|activiteit|taak|atividade|tarefa|arbeitsgang|tatigkeit|leistung',
  ],
  [
    'optimistic',
    1,
    'optimistisch|optimistische dauer|optimiste|duree optimiste|optimista|duracion optimista|tiempo optimista|ottimistica|durata ottimistica|ottimistico|otimista|minimal|minimo|minimale',
  ],
  [
    'likely',
    1,
    'wahrscheinlich|am wahrscheinlichsten|wahrscheinlichste dauer|wahrscheinlichste|haufigste|plus probable|vraisemblable|duree probable|mas probable|probabile|piu probabile|durata probabile|duracion probable|waarschijnlijk|meest waarschijnlijk|mais provavel|realistisch|realiste|realista|normal dauer',
  ],
  [
    'pessimistic',
    1,
    'pessimistisch|pessimistische dauer|pessimiste|duree pessimiste|pesimista|duracion pesimista|tiempo pesimista|pessimistica|durata pessimistica|pessimistico|pessimista|maximal|massimo|maximo|maximale',
  ],
  [
    'duration',
    1,
    'dauer|vorgangsdauer|duree|duracion|durata|duur|duracao|dauer in tagen|duree en jours|arbeitstage|tage',
  ],
  ['duration', 0.8, 'jours|dias|dagen|giorni|plazo|delai'],
  [
    'predecessors',
    1,
    'vorganger|vorgaenger|vorgangernr|vorganger nr|predecesseur|predecesseurs|antecedent|antecedents|anteriorite|anteriorites|tache precedente|taches precedentes|predecesor|predecesora|predecesores|predecesoras|precedente|precedentes|precedencia|precedencias|actividad precedente|actividades precedentes|predecessore|predecessori|precedenza|precedenze|attivita precedente|attivita precedenti|voorganger|voorgangers|predecessora|predecessoras|antecessora|antecessoras|abhangig von|depend de|dipende da|depende de|nach',
  ],
  [
    'successors',
    1,
    'nachfolger|successeur|successeurs|sucesor|sucesora|sucesores|sucesoras|successore|successori|opvolger|opvolgers|sucessora|sucessoras|folgt',
  ],
  [
    'relation',
    1,
    'anordnungsbeziehung|beziehung|aob|lien|type de lien|relacion|tipo de relacion|relazione|tipo di relazione|tipo relazione|relatie',
  ],
  ['relation', 0.6, 'tipo|art'],
  ['lag', 1, 'zeitabstand|abstand|decalage|desfase|retardo|ritardo|vertraging|wartezeit'],
  ['wbs', 1, 'psp|psp code|psp nr|psp element|otp|edt|wps'],
  ['calendar', 1, 'kalender|calendrier|calendario'],
  [
    'resource',
    1,
    'ressource|ressourcen|ressources|recurso|recursos|risorsa|risorse|kolonne|equipe|cuadrilla',
  ],
  [
    'responsible',
    1,
    'verantwortlich|zustandig|responsable|responsabile|verantwoordelijk|verantwoordelijke|responsavel',
  ],
  [
    'start',
    1,
    'anfang|beginn|debut|date de debut|inicio|fecha de inicio|comienzo|inizio|data inizio|begin datum|startdatum',
  ],
  [
    'finish',
    1,
    'ende|fin|date de fin|fecha de fin|fecha fin|fine|data fine|einde|einddatum|enddatum|termino',
  ],
  ['totalFloat', 1, 'gesamtpuffer|puffer|gp|marge|marge totale|holgura|holgura total|margine|speling|folga'],
  ['critical', 1, 'kritisch|critique|critica|critico|kritiek'],
  [
    'notes',
    1,
    'bemerkung|bemerkungen|anmerkung|anmerkungen|hinweis|remarque|remarques|commentaire|commentaires|observaciones|notas|nota|osservazioni|opmerking|opmerkingen|observacoes',
  ],
];

export const NAMES: readonly NameEntry[] = [...ENGLISH, ...OTHERS];

/** Words by which a longer header is told, tried in this order. */
export const WORDS: readonly NameEntry[] = [
  [
    'predecessors',
    0.9,
    'predecessor|predecessors|preds|pred|preceding|prerequisite|prerequisites|depends|dependency|dependencies|vorganger|predecesseur|predecesseurs|predecesores',
  ],
  ['successors', 0.9, 'successor|successors|succs|succeeding|nachfolger'],
  [
    'optimistic',
    0.9,
    'optimistic|best case|minimum duration|min duration|min dur|optimistisch|optimiste|optimista|min time|minimum time|shortest duration',
  ],
  [
    'pessimistic',
    0.9,
    'pessimistic|worst case|maximum duration|max duration|max dur|pessimistisch|pessimiste|pesimista|max time|maximum time|longest duration',
  ],
  ['likely', 0.9, 'likely|probable|wahrscheinlich|wahrscheinlichste|vraisemblable'],
  ['actualStart', 0.8, 'actual start'],
  ['actualFinish', 0.8, 'actual finish|actual end'],
  ['remaining', 0.8, 'remaining duration|remaining dur'],
  ['totalFloat', 0.8, 'total float|total slack'],
  ['percentComplete', 0.8, 'percent complete|percent done'],
  ['constraintDate', 0.8, 'constraint date'],
  ['constraintKind', 0.8, 'constraint type'],
  ['relation', 0.8, 'relationship|relation|link type'],
  ['lag', 0.8, 'lag'],
  [
    'id',
    0.85,
    'activity id|task id|activity code|activity no|activity number|task no|task number|identifier|unique id',
  ],
  ['name', 0.8, 'activity name|task name|description|bezeichnung|descripcion|descrizione'],
  ['wbs', 0.8, 'wbs'],
  ['duration', 0.8, 'duration|dauer|duree|duracion|durata|duur'],
  ['notes', 0.7, 'remarks|comments|notes'],
];

/** Words that make a column something else, whatever stands beside them. */
export const OTHER_THINGS =
  /\b(?:cost|costs|price|budget|amount|rate|value|effort|labou?r hours?|man ?hours?|man ?days?|manhours|mandays|hours? per|probability|risk|variance|deviation|std|sigma|quantity|qty|unit|units|uom|area|weight|kosten|cout|coste|costo|priority|revision|rev|late start|late finish|latest start|latest finish|free float|ls|lf|ff float|actual duration|baseline duration|at completion)\b/;

/** Headers of one letter or two, which mean the estimates where all of a set are there. */
export const LETTER_SETS: readonly (readonly [optimistic: string, likely: string, pessimistic: string])[] = [
  ['a', 'm', 'b'],
  ['o', 'm', 'p'],
  ['o', 'ml', 'p'],
  ['to', 'tm', 'tp'],
  ['ta', 'tm', 'tb'],
  ['t o', 't m', 't p'],
  ['t a', 't m', 't b'],
  ['l', 'm', 'h'],
  ['o', 'l', 'p'],
  ['o', 'n', 'p'],
  ['o', 'r', 'p'],
  ['b', 'm', 'w'],
  ['b', 'ml', 'w'],
];
