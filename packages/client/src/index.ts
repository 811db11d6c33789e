export { ApiError, isApiError } from './call/api-error.ts';
export { addressOf, call, type Request } from './call/call.ts';
export { upload } from './call/upload.ts';
export { createQueryClient } from './query-client.ts';
export { registerPasswordDialog, withFreshPassword } from './session/fresh-call.ts';
export { hasRole, sessionKey, sessionQuery, useMember, useSignIn, useSignOut } from './session/session.queries.ts';
