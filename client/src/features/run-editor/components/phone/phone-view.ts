/** What stands in the middle of the phone's layout. */
export const PHONE_VIEWS = ['list', 'piece', 'fix', 'add', 'sketch'] as const;
export type PhoneView = (typeof PHONE_VIEWS)[number];
