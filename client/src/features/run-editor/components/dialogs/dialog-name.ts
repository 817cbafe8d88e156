/** The dialogs of the run editor; one is open at a time. */
export type DialogName = 'identity' | 'saving' | 'keys' | 'raceway' | 'rules';
