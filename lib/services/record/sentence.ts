/** What the record tells of: a verb with its data, kept as they are; the sentence is made when it is read. */
interface Verbs {
  'submission received': { revision: number; file: string; sha256: string; findings: number };
  'submission superseded': { revision: number };
  'fixes adopted': { batch: string; fixes: number; cells: number; rules: string[] };
  'cells edited': { batch: string; cells: string[]; more: number };
  'corrections undone': { batch: string; corrections: number; cells: number };
  'fix declined': FixData;
  'fix proposed again': FixData;
  'comment added': { comment: string; rule: string | null; row: number | null };
  'contractor added': { contractor: string; name: string };
  'member added': MemberData;
  'member invited again': MemberData;
  'member disabled': MemberData;
  'member enabled': MemberData;
  'password set': { email: string };
  'token made': { email: string; name: string; readOnly: boolean };
  'project added': { project: string; code: string };
  'project changed': { project: string; code: string; fields: string[] };
}

interface FixData {
  fix: string;
  rule: string;
  cell: string | null;
}

interface MemberData {
  member: string;
  name: string;
  email: string;
  role: string;
}

type RecordVerb = keyof Verbs;
export type RecordEvent = { [V in RecordVerb]: { verb: V; data: Verbs[V] } }[RecordVerb];

const SENTENCES: { [V in RecordVerb]: (data: Verbs[V]) => string } = {
  'submission received': (d) =>
    `Received ${d.file} as Rev ${d.revision}; the audit found ${count(d.findings, 'defect')}.`,
  'submission superseded': (d) => `Rev ${d.revision} came in and supersedes this one.`,
  'fixes adopted': (d) =>
    `Adopted ${count(d.fixes, 'fix', 'fixes')} in ${count(d.cells, 'cell')} (${d.rules.join(', ')}).`,
  'cells edited': (d) =>
    `Edited ${d.cells.join(', ')}${d.more > 0 ? ` and ${count(d.more, 'more cell')}` : ''} by hand.`,
  'corrections undone': (d) => `Undid ${count(d.corrections, 'correction')} in ${count(d.cells, 'cell')}.`,
  'fix declined': (d) => `Declined the fix for ${about(d)}.`,
  'fix proposed again': (d) => `Took back the declining of the fix for ${about(d)}.`,
  'comment added': (d) =>
    d.rule ? `Commented on a finding (${d.rule}).` : d.row ? `Commented on row ${d.row}.` : 'Commented.',
  'contractor added': (d) => `Added the contractor ${d.name}.`,
  'member added': (d) => `Added ${d.name} (${d.email}) as ${d.role}.`,
  'member invited again': (d) => `Made a new invitation for ${d.name} (${d.email}).`,
  'member disabled': (d) => `Took the membership of ${d.name} (${d.email}) away.`,
  'member enabled': (d) => `Gave the membership of ${d.name} (${d.email}) back.`,
  'password set': (d) => `${d.email} set a password by invitation.`,
  'token made': (d) =>
    `Made the API token “${d.name}” for ${d.email}${d.readOnly ? ', for reading only' : ''}.`,
  'project added': (d) => `Added the project ${d.code}.`,
  'project changed': (d) => `Changed ${d.fields.join(', ')} of the project ${d.code}.`,
};

/** The plain sentence of an entry. */
export function recordSentence(verb: string, data: unknown): string {
  return isKnown(verb) ? (SENTENCES[verb] as (data: unknown) => string)(data) : verb;
}

function isKnown(verb: string): verb is RecordVerb {
  return Object.hasOwn(SENTENCES, verb);
}

function about({ rule, cell }: FixData): string {
  return cell ? `${rule} in ${cell}` : rule;
}

function count(n: number, one: string, many = `${one}s`): string {
  return n === 1 ? `one ${one}` : `${n.toLocaleString('en-GB')} ${many}`;
}
