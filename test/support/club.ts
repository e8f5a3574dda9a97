import type { Role } from '../../shared/contracts/session.ts';
import type { ApiClient } from './api-client.ts';
import type { ApiServer } from './api-server.ts';

/** A new club with one person of each role, whose sessions are in it. */
export async function club(server: ApiServer): Promise<Record<Role, ApiClient>> {
  const clubId = await server.services.workshops.found('Club');
  const admit = async (role: Role): Promise<ApiClient> => {
    const person = await server.newcomer();
    const { body } = await person.get('/api/session').expect(200);
    await server.services.workshops.admit(body.id, clubId, role);
    await person.put('/api/session', { workshopId: clubId }).expect(200);
    return person;
  };
  return {
    member: await admit('member'),
    librarian: await admit('librarian'),
    admin: await admit('admin'),
  };
}
