/** What an access token must carry; signing and checking read the same values. */
export const ISSUER = 'fairlead';
export const AUDIENCE = 'fairlead-api';
export const ACCESS_SECONDS = 15 * 60;
