import { z } from 'zod';
import { amountMinor, isoTime, nothing, role, shortText } from './common.ts';
import { endpoints } from './endpoint.ts';

export const passwordLimits = { min: 12, max: 1024 } as const;

const email = z.email('Enter an e-mail address like name@firm.example.').max(254);
const newPassword = z
  .string()
  .min(passwordLimits.min, `Use at least ${passwordLimits.min} characters.`)
  .max(passwordLimits.max, `Use at most ${passwordLimits.max} characters.`);

export const memberName = shortText(80)
  .min(2, 'Enter the name of your firm or your own.')
  .regex(/^[^\p{Cc}]*$/u, 'Leave out line breaks and control characters.');
export const place = shortText(60)
  .min(2, 'Enter the town you trade from.')
  .regex(/^[^\p{Cc}]*$/u);

export const registerRequest = z.strictObject({
  email,
  password: newPassword,
  name: memberName,
  place,
  roles: z.array(z.enum(['seller', 'buyer'])).min(1, 'Choose selling, buying or both.'),
});
export type RegisterRequest = z.infer<typeof registerRequest>;

/** Six digits of the authenticator app, or a recovery code; gaps and dashes do not matter. */
const secondStepCode = z
  .string()
  .trim()
  .min(6, 'Enter the six digits of the app, or a recovery code.')
  .max(40, 'Enter the six digits of the app, or a recovery code.');

export const signInRequest = z.strictObject({
  email,
  password: z.string().min(1, 'Enter your password.').max(1024),
  /** Wanted from members with a second step, who are answered `session.code_required` without it. */
  code: secondStepCode.optional(),
});
export type SignInRequest = z.infer<typeof signInRequest>;
export const tokenRequest = z.strictObject({ token: z.string().min(20).max(200) });
export const resetRequest = z.strictObject({ email });
export const resetCompletion = z.strictObject({ token: z.string().min(20).max(200), password: newPassword });
export const passwordRequest = z.strictObject({ password: z.string().min(1, 'Enter your password.').max(1024) });
export const passwordChange = z.strictObject({ currentPassword: z.string().min(1).max(1024), newPassword });
/** `roles` are those a member may choose; operators and assayers may go without. */
export const profileChange = z.strictObject({
  name: memberName,
  place,
  roles: z.array(z.enum(['seller', 'buyer'])),
});

export const totpCodeRequest = z.strictObject({ code: secondStepCode });
export type TotpCodeRequest = z.infer<typeof totpCodeRequest>;

/** The second step at sign-in as its member sees it. */
export const totpView = z.object({ isOn: z.boolean(), recoveryCodesLeft: z.int() }).meta({ id: 'SecondStep' });
export type TotpView = z.infer<typeof totpView>;

/** What an authenticator app takes over; shown once, and worth nothing before it is confirmed. */
export const totpSetup = z
  .object({
    /** Base32. */
    secret: z.string(),
    uri: z.string(),
    /** The URI as a QR code: an SVG document of paths alone. */
    qrSvg: z.string(),
  })
  .meta({ id: 'SecondStepSetup' });
export type TotpSetup = z.infer<typeof totpSetup>;

export const recoveryCodes = z.object({ recoveryCodes: z.array(z.string()) }).meta({ id: 'RecoveryCodes' });

export const ownMember = z
  .object({
    id: z.uuid(),
    email: z.string(),
    name: z.string(),
    place: z.string(),
    roles: z.array(role),
    emailConfirmed: z.boolean(),
    verified: z.boolean(),
    limitMinor: amountMinor,
  })
  .meta({ id: 'OwnMember' });
export type OwnMember = z.infer<typeof ownMember>;

export const sessionView = z
  .object({
    member: ownMember.nullable(),
    /** Until when money may be moved without entering the password again. */
    freshUntil: isoTime.nullable(),
    unreadNotices: z.int(),
  })
  .meta({ id: 'Session' });
export type SessionView = z.infer<typeof sessionView>;

export const sessionRow = z
  .object({
    id: z.uuid(),
    current: z.boolean(),
    device: z.string(),
    ip: z.string(),
    createdAt: isoTime,
    lastSeenAt: isoTime,
  })
  .meta({ id: 'SessionRow' });
export type SessionRow = z.infer<typeof sessionRow>;

export const noticeView = z
  .object({
    id: z.uuid(),
    kind: z.string(),
    subject: z.string(),
    text: z.string(),
    link: z.string(),
    createdAt: isoTime,
    readAt: isoTime.nullable(),
  })
  .meta({ id: 'Notice' });
export type NoticeView = z.infer<typeof noticeView>;

export const memberEndpoints = endpoints({
  'POST /members': { summary: 'Register', access: 'public', body: registerRequest, response: 'none', status: 202 },
  'POST /members/confirm': {
    summary: 'Confirm the e-mail address',
    access: 'public',
    body: tokenRequest,
    response: 'none',
    status: 204,
  },
  'PUT /members/me': {
    summary: 'Change the own profile',
    access: 'signed-in',
    body: profileChange,
    response: ownMember,
  },
  'GET /session': { summary: 'Who is signed in', access: 'public', response: sessionView },
  'POST /session': { summary: 'Sign in', access: 'public', body: signInRequest, response: sessionView },
  'POST /session/refresh': {
    summary: 'Renew the session by its refresh cookie',
    access: 'public',
    body: nothing,
    response: sessionView,
  },
  'POST /session/password': {
    summary: 'Enter the password again before money moves',
    access: 'signed-in',
    body: passwordRequest,
    response: sessionView,
  },
  'DELETE /session': { summary: 'Sign out', access: 'public', response: 'none', status: 204 },
  'GET /sessions': { summary: 'Own sessions', access: 'signed-in', response: z.array(sessionRow) },
  'DELETE /sessions/:sessionId': {
    summary: 'End one of the own sessions',
    access: 'signed-in',
    owned: { kind: 'session', param: 'sessionId' },
    params: z.object({ sessionId: z.uuid() }),
    response: 'none',
    status: 204,
  },
  'POST /password-resets': {
    summary: 'Ask for a reset link',
    access: 'public',
    body: resetRequest,
    response: 'none',
    status: 202,
  },
  'POST /password-resets/complete': {
    summary: 'Set a new password by a reset link',
    access: 'public',
    body: resetCompletion,
    response: 'none',
    status: 204,
  },
  'POST /password': {
    summary: 'Change the password',
    access: 'signed-in',
    body: passwordChange,
    response: 'none',
    status: 204,
  },
  'GET /my/totp': { summary: 'The own second step at sign-in', access: 'signed-in', response: totpView },
  'POST /my/totp': {
    summary: 'Begin to set up a second step',
    access: 'signed-in',
    fresh: true,
    body: nothing,
    response: totpSetup,
  },
  'POST /my/totp/confirm': {
    summary: 'Turn the second step on by a first code',
    access: 'signed-in',
    body: totpCodeRequest,
    response: recoveryCodes,
  },
  'POST /my/totp/remove': {
    summary: 'Turn the second step off',
    access: 'signed-in',
    fresh: true,
    body: totpCodeRequest,
    response: 'none',
    status: 204,
  },
  'GET /my/notices': { summary: 'Own notices, newest first', access: 'signed-in', response: z.array(noticeView) },
  'POST /my/notices/read': {
    summary: 'Mark all notices as read',
    access: 'signed-in',
    body: nothing,
    response: 'none',
    status: 204,
  },
});
