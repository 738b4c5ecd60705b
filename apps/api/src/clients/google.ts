import * as z from 'zod/mini';
import {
  Strategy,
  type Profile,
  type StrategyOptions,
  type VerifyCallback,
} from 'passport-google-oauth20';

export type GoogleSettings = {
  readonly clientId: string;
  readonly clientSecret: string;
  readonly authorizationUrl: string;
  readonly tokenUrl: string;
  readonly userInfoUrl: string;
};

/** What Google says about an account. `sub` never changes; the address may. */
export type GoogleProfile = {
  readonly sub: string;
  /** Lower case. */
  readonly email: string;
  readonly emailVerified: boolean;
  readonly name: string;
};

/** Shows the access token in a header, not in the address, which servers write down (RFC 6750). */
class GoogleStrategy extends Strategy {
  constructor(options: StrategyOptions, verify: Verify) {
    super(options, verify);
    this._oauth2.useAuthorizationHeaderforGET(true);
  }
}

type Verify = (
  accessToken: string,
  refreshToken: string,
  profile: Profile,
  done: VerifyCallback,
) => void;

/**
 * Google's sign-in, with state and PKCE kept in the session between the two requests. Its answer
 * is the profile alone: no token of Google's is kept.
 */
export function createGoogleStrategy(settings: GoogleSettings, callbackUrl: string): Strategy {
  return new GoogleStrategy(
    {
      clientID: settings.clientId,
      clientSecret: settings.clientSecret,
      authorizationURL: settings.authorizationUrl,
      tokenURL: settings.tokenUrl,
      userProfileURL: settings.userInfoUrl,
      callbackURL: callbackUrl,
      scope: ['openid', 'email', 'profile'],
      state: true,
      pkce: true,
    },
    (_accessToken, _refreshToken, profile, done) => {
      done(null, profileOf(profile));
    },
  );
}

function profileOf({ _json: told, displayName }: Profile): GoogleProfile {
  return {
    sub: told.sub,
    email: (told.email ?? '').trim().toLowerCase(),
    // Without an address there is none that is verified.
    emailVerified: told.email !== undefined && isTrue(told.email_verified),
    name: displayName,
  };
}

/** Google has sent this as a word as well as a boolean; anything else is a no. */
function isTrue(value: unknown): boolean {
  return value === true || value === 'true';
}

const googleProfile = z.object({
  sub: z.string().check(z.minLength(1), z.maxLength(255)),
  email: z.string(),
  emailVerified: z.boolean(),
  name: z.string(),
});

/** The profile out of what passport hands on, or null where it handed on none. */
export function readGoogleProfile(told: unknown): GoogleProfile | null {
  const read = googleProfile.safeParse(told);
  return read.success ? read.data : null;
}
