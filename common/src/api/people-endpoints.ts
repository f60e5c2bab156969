import * as yup from 'yup';
import { saveCompanySettingsSchema } from '../schemas/company-settings';
import {
  acceptInvitationSchema,
  changePasswordSchema,
  createUserSchema,
  roleGrantSchema,
  signInSchema,
  updateUserSchema,
} from '../schemas/people';
import { listOf } from './answer-parts';
import { endpoint } from './endpoint';
import { listQuery, sortable } from './list-query';
import {
  companySettingsAnswer,
  currentSessionAnswer,
  grantAnswer,
  invitationAnswer,
  sessionAnswer,
  userAnswer,
} from './people-answers';
import { DRAFT_READERS } from './roles';

export const USER_SORTS = ['name', 'email', 'createdAt'] as const;

const ADMINISTRATOR = ['administrator'] as const;

/** Endpoints of signing in, of people and their grants, and of the settings of the company. */
export const peopleEndpoints = {
  // sign-in
  signIn: endpoint({
    method: 'POST',
    path: '/sessions',
    summary: 'Sign in',
    access: 'open',
    body: signInSchema,
    answer: currentSessionAnswer,
    success: 201,
  }),
  currentSession: endpoint({
    method: 'GET',
    path: '/sessions/current',
    summary: 'Who is signed in',
    access: 'open',
    answer: currentSessionAnswer,
    success: 200,
  }),
  signOut: endpoint({
    method: 'DELETE',
    path: '/sessions/current',
    summary: 'Sign out',
    access: 'signed-in',
    success: 204,
  }),
  sessions: endpoint({
    method: 'GET',
    path: '/sessions',
    summary: 'Own sessions',
    access: 'signed-in',
    answer: yup.array().of(sessionAnswer.required()).required(),
    success: 200,
  }),
  endSession: endpoint({
    method: 'DELETE',
    path: '/sessions/:id',
    summary: 'End one of the own sessions',
    access: 'signed-in',
    success: 204,
  }),
  changePassword: endpoint({
    method: 'PUT',
    path: '/account/password',
    summary: 'Change the own password; other sessions end',
    access: 'signed-in',
    body: changePasswordSchema,
    success: 204,
  }),
  acceptInvitation: endpoint({
    method: 'POST',
    path: '/invitations/acceptances',
    summary: 'Choose a password with an invitation',
    access: 'open',
    body: acceptInvitationSchema,
    success: 204,
  }),

  // people
  users: endpoint({
    method: 'GET',
    path: '/users',
    summary: 'People',
    access: ADMINISTRATOR,
    query: yup
      .object({ ...listQuery, sort: sortable(USER_SORTS), search: yup.string().max(100).optional() })
      .noUnknown(),
    answer: listOf(userAnswer.required()),
    success: 200,
  }),
  createUser: endpoint({
    method: 'POST',
    path: '/users',
    summary: 'Invite a person',
    access: ADMINISTRATOR,
    body: createUserSchema,
    answer: invitationAnswer,
    success: 201,
  }),
  updateUser: endpoint({
    method: 'PUT',
    path: '/users/:id',
    summary: 'Change or deactivate a person',
    access: ADMINISTRATOR,
    body: updateUserSchema,
    answer: userAnswer.required(),
    success: 200,
  }),
  inviteUser: endpoint({
    method: 'POST',
    path: '/users/:id/invitations',
    summary: 'Make a new invitation link',
    access: ADMINISTRATOR,
    answer: invitationAnswer,
    success: 201,
  }),
  grantRole: endpoint({
    method: 'POST',
    path: '/users/:id/grants',
    summary: 'Grant a role',
    access: ADMINISTRATOR,
    body: roleGrantSchema,
    answer: grantAnswer.required(),
    success: 201,
  }),
  endGrant: endpoint({
    method: 'DELETE',
    path: '/users/:id/grants/:grantId',
    summary: 'End a grant today',
    access: ADMINISTRATOR,
    success: 204,
  }),

  // company settings
  companySettings: endpoint({
    method: 'GET',
    path: '/company-settings',
    summary: 'Company settings in force',
    access: DRAFT_READERS,
    answer: companySettingsAnswer.required(),
    success: 200,
  }),
  saveCompanySettings: endpoint({
    method: 'PUT',
    path: '/company-settings',
    summary: 'Set a new version of the company settings',
    access: ADMINISTRATOR,
    body: saveCompanySettingsSchema,
    answer: companySettingsAnswer.required(),
    success: 200,
    ifMatch: true,
  }),
} as const;
