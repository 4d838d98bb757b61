import { z } from 'zod';
import { intakeView, matchingForm } from '@/lib/contract/intake';
import * as office from '@/lib/contract/office';
import { projectCreate, projectUpdate, projectView } from '@/lib/contract/project';
import { ruleView } from '@/lib/contract/rule';
import { items } from '@/lib/contract/shared';
import * as submission from '@/lib/contract/submission';
import type { Operation } from './operation';
import { ofSubmission } from './submission-operations';

const OFFICE = '/api/offices/{office}';
const PROJECT = `${OFFICE}/projects/{project}`;

/** As a form sends it: `columns` is JSON, and everything is text. */
const uploadForm = z.object({
  file: z.string().meta({ format: 'binary', description: 'A workbook (XLSX) or a CSV, at most 20 MB.' }),
  sheet: matchingForm.shape.sheet.describe('Repeat it for a list that goes on over several sheets.'),
  columns: z.string().optional().describe('JSON: { field: column index }, 0 for column A.'),
  headerRow: z.string().optional().describe('Row number of the header, from 1; 0 where there is none.'),
});
const submissionForm = uploadForm.extend({
  again: z
    .string()
    .optional()
    .describe(
      'For a file that is byte for byte the latest revision: `true` takes it in, `false` refuses it; else it is taken in unless that revision came while this one was on its way.',
    ),
});

const atLarge: readonly Operation[] = [
  {
    id: 'getHealth',
    method: 'get',
    path: '/api/health',
    tag: 'service',
    summary: 'Whether the service and its database answer.',
    answer: z.object({ status: z.literal('ok') }),
    problems: { 503: 'The database does not answer.' },
    open: true,
  },
  {
    id: 'getDocument',
    method: 'get',
    path: '/api/openapi.json',
    tag: 'service',
    summary: 'This document.',
    answer: z.record(z.string(), z.unknown()),
    open: true,
  },
  {
    id: 'getMe',
    method: 'get',
    path: '/api/me',
    tag: 'people',
    summary: 'Who is asking, and the offices they belong to.',
    answer: office.meView,
  },
  {
    id: 'getInvitation',
    method: 'get',
    path: '/api/invitations/{token}',
    tag: 'people',
    summary: 'Whom an invitation is for.',
    answer: office.invitationCheck,
    open: true,
  },
  {
    id: 'acceptInvitation',
    method: 'post',
    path: '/api/invitations/{token}',
    tag: 'people',
    summary: 'Sets the password; the link works once.',
    body: office.passwordSet,
    status: 204,
    open: true,
  },
];

const inOffice: readonly Operation[] = [
  {
    id: 'getOffice',
    method: 'get',
    path: OFFICE,
    tag: 'office',
    summary: 'The office, and what the asker may do in it.',
    answer: office.officeView,
  },
  {
    id: 'listContractors',
    method: 'get',
    path: `${OFFICE}/contractors`,
    tag: 'office',
    summary: 'The contractors; for a scheduler its own.',
    answer: items(office.contractorView),
  },
  {
    id: 'createContractor',
    method: 'post',
    path: `${OFFICE}/contractors`,
    tag: 'office',
    summary: 'Adds a contractor.',
    body: office.contractorCreate,
    status: 201,
    answer: office.contractorView,
    problems: { 409: 'There is one of that name.' },
  },
  {
    id: 'listMembers',
    method: 'get',
    path: `${OFFICE}/members`,
    tag: 'people',
    summary: 'The people of the office and of its contractors.',
    answer: items(office.memberView),
  },
  {
    id: 'createMember',
    method: 'post',
    path: `${OFFICE}/members`,
    tag: 'people',
    summary: 'Adds a person; the answer holds the one-time link to set a password.',
    body: office.memberCreate,
    status: 201,
    answer: office.invitationView,
    problems: { 409: 'The person is a member already.' },
  },
  {
    id: 'updateMember',
    method: 'patch',
    path: `${OFFICE}/members/{member}`,
    tag: 'people',
    summary: 'Takes a membership away, or gives it back.',
    body: office.memberUpdate,
    answer: office.memberView,
    problems: { 409: 'Nobody would be left to run the office.' },
  },
  {
    id: 'inviteMember',
    method: 'post',
    path: `${OFFICE}/members/{member}/invitation`,
    tag: 'people',
    summary: 'A new one-time link; the one before stops working.',
    status: 201,
    answer: office.invitationView,
  },
  {
    id: 'listRules',
    method: 'get',
    path: `${OFFICE}/rules`,
    tag: 'audit',
    summary: 'The rules of the audit.',
    answer: items(ruleView),
  },
  {
    id: 'listProjects',
    method: 'get',
    path: `${OFFICE}/projects`,
    tag: 'projects',
    summary: 'The projects, each with its latest revision.',
    answer: items(projectView),
  },
  {
    id: 'createProject',
    method: 'post',
    path: `${OFFICE}/projects`,
    tag: 'projects',
    summary: 'Adds a project.',
    body: projectCreate,
    status: 201,
    answer: projectView,
    problems: { 409: 'There is one with that code.' },
  },
  {
    id: 'getProject',
    method: 'get',
    path: PROJECT,
    tag: 'projects',
    summary: 'One project.',
    answer: projectView,
  },
  {
    id: 'updateProject',
    method: 'patch',
    path: PROJECT,
    tag: 'projects',
    summary: 'Changes what is named; a new start, target or calendar moves every figure.',
    body: projectUpdate,
    answer: projectView,
    problems: { 409: 'There is one with that code.' },
  },
  {
    id: 'createIntake',
    method: 'post',
    path: `${OFFICE}/intake`,
    tag: 'submissions',
    summary: 'Reads a file and says how it would be read; nothing is kept.',
    form: uploadForm,
    answer: intakeView,
  },
  {
    id: 'listSubmissions',
    method: 'get',
    path: `${PROJECT}/submissions`,
    tag: 'submissions',
    summary: 'The revisions of a project, the first one first.',
    answer: items(submission.submissionView),
  },
  {
    id: 'createSubmission',
    method: 'post',
    path: `${PROJECT}/submissions`,
    tag: 'submissions',
    summary: 'Takes a file in as the next revision and audits it.',
    form: submissionForm,
    status: 201,
    answer: submission.submissionView,
    problems: { 409: 'It is byte for byte the latest revision.' },
  },
];

export const OPERATIONS: readonly Operation[] = [...atLarge, ...inOffice, ...ofSubmission];
