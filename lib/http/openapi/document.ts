import { createDocument, type ZodOpenApiPathsObject } from 'zod-openapi';
import { intakeView } from '@/lib/contract/intake';
import { contractorView, memberView } from '@/lib/contract/office';
import { projectView } from '@/lib/contract/project';
import { ruleView } from '@/lib/contract/rule';
import { problem } from '@/lib/contract/shared';
import {
  activityView,
  commentView,
  correctionView,
  findingView,
  submissionView,
} from '@/lib/contract/submission';
import { describe } from './operation';
import { OPERATIONS } from './operations';

/** The OpenAPI document, made from the shapes that the use-cases validate with. */
export function openApiDocument(): ReturnType<typeof createDocument> {
  return createDocument({
    openapi: '3.1.0',
    info: {
      title: 'Plumbrow',
      version: '1',
      description:
        'One surface for the pages and for the scripts of a programme office. Durations are working days; nothing is rounded.',
    },
    security: [{ token: [] }, { session: [] }],
    paths: paths(),
    components: {
      schemas: {
        Problem: problem,
        Contractor: contractorView,
        Member: memberView,
        Project: projectView,
        Rule: ruleView,
        Intake: intakeView,
        Submission: submissionView,
        Activity: activityView,
        Finding: findingView,
        Correction: correctionView,
        Comment: commentView,
      },
      securitySchemes: {
        token: {
          type: 'http',
          scheme: 'bearer',
          description: 'An API token; it acts with its owner’s role.',
        },
        session: { type: 'apiKey', in: 'cookie', name: 'next-auth.session-token' },
      },
    },
  });
}

function paths(): ZodOpenApiPathsObject {
  const byPath: Record<string, Record<string, ReturnType<typeof describe>>> = {};
  for (const operation of OPERATIONS) (byPath[operation.path] ??= {})[operation.method] = describe(operation);
  return byPath;
}
