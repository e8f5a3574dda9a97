import { DOCUMENT } from '@angular/core';
import { TestBed } from '@angular/core/testing';

import { Preferences } from './preferences';

describe('the preferences', () => {
  beforeEach(() => localStorage.clear());

  it('begin with paper', () => {
    expect(TestBed.inject(Preferences).theme()).toBe('paper');
  });

  it('remember the light that was chosen and put it on the page', () => {
    TestBed.inject(Preferences).setTheme('walnut');
    TestBed.tick();
    const { theme } = TestBed.inject(DOCUMENT).documentElement.dataset;
    TestBed.resetTestingModule();

    expect(theme).toBe('walnut');
    expect(TestBed.inject(Preferences).theme()).toBe('walnut');
  });

  it('pay no heed to what nobody could have chosen', () => {
    localStorage.setItem('fallow.theme', 'neon');

    expect(TestBed.inject(Preferences).theme()).toBe('paper');
  });
});
