import { getRuntime } from '@/server/runtime';
import { toProblemDocument, type ProblemDocument } from '@/server/problem';

/** Any error as a problem document; what is not a plain refusal goes to the log. */
export function problemOf(error: unknown): ProblemDocument {
  const problem = toProblemDocument(error);
  if (problem.code === 'internal') getRuntime().logger.error({ err: error }, 'a request failed');
  return problem;
}

/** The answer of a route handler to an error (RFC 9457). */
export function problemResponse(error: unknown): Response {
  const problem = problemOf(error);
  return Response.json(problem, {
    status: problem.status,
    headers: { 'Content-Type': 'application/problem+json' },
  });
}
