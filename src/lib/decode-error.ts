import { errorBody } from '#shared/contracts/error-codes.ts';
import { ApiError } from './api-error.ts';

/** Turns an answer that is not a success into an ApiError; one that no contract knows becomes 'unexpected-answer'. */
export async function decodeError(response: Response): Promise<ApiError> {
  const text = await response.text();
  let data: unknown;
  try {
    data = JSON.parse(text);
  } catch {
    return new ApiError(
      response.status,
      'unexpected-answer',
      `The server answered ${response.status} and not in JSON.`,
    );
  }
  const read = errorBody.safeParse(data);
  if (!read.success)
    return new ApiError(
      response.status,
      'unexpected-answer',
      `The server answered ${response.status} without a code that is known.`,
    );
  return new ApiError(response.status, read.data.code, read.data.message, read.data.fields ?? [], read.data.details);
}
