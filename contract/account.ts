import { z } from 'zod';
import { Email, Id, Name, Timestamp } from './common';

export const Preferences = z
  .strictObject({
    frequencyUnit: z.enum(['rad/s', 'Hz']),
    magnitudeUnit: z.enum(['dB', 'factor']),
    speedUnit: z.enum(['m/s', 'km/h']),
    theme: z.enum(['system', 'light', 'dark']),
    singleKeys: z.boolean().meta({ description: 'single-letter keys on the bench' }),
  })
  .meta({ id: 'Preferences' });
export type Preferences = z.infer<typeof Preferences>;

export const defaultPreferences: Preferences = {
  frequencyUnit: 'rad/s',
  magnitudeUnit: 'dB',
  speedUnit: 'm/s',
  theme: 'system',
  singleKeys: true,
};

export const TeamRole = z.enum(['owner', 'member']);

export const Me = z
  .object({
    id: z.string(),
    name: z.string(),
    email: z.string(),
    emailVerified: z.boolean(),
    teams: z.array(z.object({ id: Id, name: z.string(), role: TeamRole })),
    preferences: Preferences,
  })
  .meta({ id: 'Me' });
export type Me = z.infer<typeof Me>;

export const UpdateMe = z.strictObject({ name: Name.optional(), preferences: Preferences.partial().optional() }).meta({ id: 'UpdateMe' });
export type UpdateMe = z.infer<typeof UpdateMe>;

/** One signed-in device, as GET /api/me/sessions lists it. */
export const DeviceSession = z
  .object({
    id: z.string(),
    current: z.boolean(),
    device: z.string(),
    address: z.string().nullable(),
    createdAt: Timestamp,
    lastSeenAt: Timestamp,
    expiresAt: Timestamp,
  })
  .meta({ id: 'DeviceSession' });
export type DeviceSession = z.infer<typeof DeviceSession>;

export const passwordLength = { least: 12, most: 128 };
const Password = z
  .string()
  .min(passwordLength.least, 'A password has 12 characters or more.')
  .max(passwordLength.most, 'A password has at most 128 characters.');

/** A path of this site, to land on after a link in a mail. */
const LandingPath = z
  .string()
  .max(200)
  .regex(/^\/(?![/\\])[^\\]*$/, 'A path of this site begins with one slash.');

/** Bodies of the sign-in routes, under better-auth's names for them. */
export const SignUp = z.strictObject({ name: Name, email: Email, password: Password }).meta({ id: 'SignUp' });
export type SignUp = z.infer<typeof SignUp>;
export const SignIn = z
  .strictObject({ email: Email, password: z.string().min(1, 'A password is needed.').max(passwordLength.most) })
  .meta({ id: 'SignIn' });
export type SignIn = z.infer<typeof SignIn>;
export const AskReset = z.strictObject({ email: Email, redirectTo: LandingPath.optional() }).meta({ id: 'AskReset' });
export type AskReset = z.infer<typeof AskReset>;
export const ResetPassword = z.strictObject({ newPassword: Password });
export type ResetPassword = z.infer<typeof ResetPassword>;
export const ResetPasswordByToken = ResetPassword.extend({ token: z.string().min(1).max(200) }).meta({ id: 'ResetPasswordByToken' });
export const ChangePassword = z
  .strictObject({
    currentPassword: SignIn.shape.password,
    newPassword: Password,
    revokeOtherSessions: z.literal(true).optional().meta({ description: 'always so, whether said or not' }),
  })
  .meta({ id: 'ChangePassword' });
export type ChangePassword = z.infer<typeof ChangePassword>;
export const SendVerification = z.strictObject({ email: Email, callbackURL: LandingPath.optional() }).meta({ id: 'SendVerification' });
export type SendVerification = z.infer<typeof SendVerification>;
export const VerifyEmail = z.strictObject({ token: z.string().min(1).max(2000), callbackURL: LandingPath.default('/verified') });
