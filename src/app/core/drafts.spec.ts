import { signal } from '@angular/core';
import { TestBed } from '@angular/core/testing';

import { Drafts } from './drafts';
import { Session } from './session/session';

function arrange() {
  localStorage.clear();
  const user = signal<{ id: number } | null>({ id: 1 });
  TestBed.configureTestingModule({ providers: [{ provide: Session, useValue: { user } }] });
  return { drafts: TestBed.inject(Drafts), user };
}

describe('the drafts', () => {
  it('come back as they were written', () => {
    const { drafts } = arrange();

    drafts.write('receiver.new', { name: 'Kestrel' });

    expect(drafts.read('receiver.new')).toEqual({ name: 'Kestrel' });
  });

  it('of one account are not shown to another', () => {
    const { drafts, user } = arrange();
    drafts.write('receiver.new', { name: 'Kestrel' });

    user.set({ id: 2 });

    expect(drafts.read('receiver.new')).toBeNull();
  });

  it('of a visitor are taken over by whoever signs in', () => {
    const { drafts, user } = arrange();
    user.set(null);
    drafts.write('receiver.new', { name: 'Kestrel' });

    user.set({ id: 2 });

    expect(drafts.read('receiver.new')).toEqual({ name: 'Kestrel' });
  });

  it('are gone once removed', () => {
    const { drafts } = arrange();
    drafts.write('receiver.new', 1);

    drafts.remove('receiver.new');

    expect(drafts.read('receiver.new')).toBeNull();
  });

  it('that cannot be read are none', () => {
    const { drafts } = arrange();
    localStorage.setItem('fallow.draft.1.receiver.new', '{');

    expect(drafts.read('receiver.new')).toBeNull();
  });
});
