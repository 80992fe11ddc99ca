import { endpoint, endpointInSteps } from '@/lib/api/endpoint';

import { acceptInvitation, readInvitation } from './accept-invitation';
import * as account from './account-contract';
import { changeRoles, setPersonActive } from './change-member';
import { changePassword, proveCurrentPassword } from './change-password';
import { inviteColleague, listColleagues, setColleagueActive } from './colleagues';
import { createToken } from './create-token';
import { endMySessions } from './end-my-sessions';
import { invitePerson, renewInvitation, withdrawInvitation } from './invite-person';
import { getAccount, updateAccount } from './my-account';
import { readMailedLink } from './read-mailed-link';
import { requestReset, requestSignInLink } from './request-mailed-link';
import { resetPassword } from './reset-password';
import { revokeToken } from './revoke-token';
import { listPeople } from './team';
import * as team from './team-contract';
import * as token from './token-contract';
import { listTokens } from './tokens';

export const getAccountEndpoint = endpoint(account.getAccount, getAccount);
export const updateAccountEndpoint = endpoint(account.updateAccount, updateAccount);
export const changePasswordEndpoint = endpointInSteps(account.changePassword, {
  outside: proveCurrentPassword,
  run: changePassword,
});
export const endMySessionsEndpoint = endpoint(account.endMySessions, endMySessions);
export const requestSignInLinkEndpoint = endpoint(account.requestSignInLink, requestSignInLink);
export const requestResetEndpoint = endpoint(account.requestReset, requestReset);
export const readMailedLinkEndpoint = endpoint(account.readMailedLink, readMailedLink);
export const resetPasswordEndpoint = endpoint(account.resetPassword, resetPassword);
export const readInvitationEndpoint = endpoint(account.readInvitation, readInvitation);
export const acceptInvitationEndpoint = endpoint(account.acceptInvitation, acceptInvitation);

export const listPeopleEndpoint = endpoint(team.listPeople, listPeople);
export const invitePersonEndpoint = endpoint(team.invitePerson, invitePerson);
export const renewInvitationEndpoint = endpoint(team.renewInvitation, renewInvitation);
export const withdrawInvitationEndpoint = endpoint(team.withdrawInvitation, withdrawInvitation);
export const changeRolesEndpoint = endpoint(team.changeRoles, changeRoles);
export const setPersonActiveEndpoint = endpoint(team.setPersonActive, setPersonActive);

export const listColleaguesEndpoint = endpoint(team.listColleagues, listColleagues);
export const inviteColleagueEndpoint = endpoint(team.inviteColleague, inviteColleague);
export const setColleagueActiveEndpoint = endpoint(team.setColleagueActive, setColleagueActive);

export const listTokensEndpoint = endpoint(token.listTokens, listTokens);
export const createTokenEndpoint = endpoint(token.createToken, createToken);
export const revokeTokenEndpoint = endpoint(token.revokeToken, revokeToken);
