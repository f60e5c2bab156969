import { PASSWORD_LENGTH } from '@bellgap/common/schemas';

export const PASSWORD_HINT = `${PASSWORD_LENGTH.atLeast} to ${PASSWORD_LENGTH.atMost} characters of any kind; no common password, not your name.`;
