import * as yup from 'yup';
import { CHECK_CATEGORIES, ROLES } from '../api/roles';
import { COMMON_PASSWORDS } from './common-passwords';
import { dateText, requiredText } from './parts';

/** Length of a password in characters; any composition is welcome. */
export const PASSWORD_LENGTH = { atLeast: 8, atMost: 128 } as const;
const PRODUCT_NAME = 'bellgap';

/**
 * What is wrong with a new password, or null. Refused are the common ones and those that hold the product's name or a
 * part of the person's own name or address, whatever the case of the letters.
 */
export function passwordFault(
  password: string,
  person: { name?: string | null; email?: string | null },
): string | null {
  const length = [...password].length;
  if (length < PASSWORD_LENGTH.atLeast) return `Use at least ${PASSWORD_LENGTH.atLeast} characters`;
  if (length > PASSWORD_LENGTH.atMost) return `Use at most ${PASSWORD_LENGTH.atMost} characters`;
  const lower = password.toLowerCase();
  if (COMMON_PASSWORDS.has(lower)) return 'This password is among the common ones; choose another';
  if (lower.includes(PRODUCT_NAME)) return 'The password must not contain the name of this product';
  const own = [person.name ?? '', (person.email ?? '').split('@')[0] ?? '']
    .flatMap((words) => words.toLowerCase().split(/[^\p{L}\p{N}]+/u))
    .filter((word) => word.length >= 4);
  if (own.some((word) => lower.includes(word))) return 'The password must not contain your name or address';
  return null;
}

export function newPassword() {
  return yup
    .string()
    .typeError('Password: text is needed')
    .required('Password: is needed')
    .test('good-enough', function (value) {
      const fault = value ? passwordFault(value, {}) : null;
      return fault === null || this.createError({ message: fault });
    });
}

export const emailSchema = requiredText('E-mail address', 254).email(
  'E-mail address: an address such as name@company.example is needed',
);

export const signInSchema = yup
  .object({
    email: yup.string().typeError('E-mail address: text is needed').required('E-mail address: is needed').max(254),
    password: yup.string().typeError('Password: text is needed').required('Password: is needed').max(1000),
  })
  .noUnknown();

export const changePasswordSchema = yup
  .object({
    currentPassword: yup
      .string()
      .typeError('Current password: text is needed')
      .required('Current password: is needed')
      .max(1000),
    newPassword: newPassword(),
  })
  .noUnknown();

export const acceptInvitationSchema = yup
  .object({ token: requiredText('Invitation', 200), password: newPassword() })
  .noUnknown();

export const requestPasswordResetSchema = yup.object({ email: emailSchema }).noUnknown();

export const acceptPasswordResetSchema = yup
  .object({ token: requiredText('Link', 200), password: newPassword() })
  .noUnknown();

export const createUserSchema = yup.object({ email: emailSchema, name: requiredText('Name', 120) }).noUnknown();

export const updateUserSchema = yup
  .object({
    email: emailSchema,
    name: requiredText('Name', 120),
    active: yup.boolean().typeError('Active: yes or no').required(),
  })
  .noUnknown();

export const roleGrantSchema = yup
  .object({
    role: yup
      .string()
      .oneOf([...ROLES], 'Role: choose one of the list')
      .required('Role: is needed'),
    /** Null for all projects. */
    projectCode: yup.string().nullable().max(40).defined(),
    checkCategory: yup
      .number()
      .typeError('Check category: 1, 2 or 3')
      .nullable()
      .oneOf([...CHECK_CATEGORIES, null], 'Check category: 1, 2 or 3')
      .defined(),
    validFrom: dateText('Valid from').required('Valid from: is needed'),
    validTo: dateText('Valid to')
      .defined()
      .test('not-before-start', 'Valid to: must not be before the start', (to, { parent }) => {
        const from = (parent as { validFrom?: string }).validFrom;
        return !to || !from || to >= from;
      }),
  })
  .noUnknown();
