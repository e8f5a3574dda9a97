import { ComponentHarness } from '@angular/cdk/testing';
import { TestbedHarnessEnvironment } from '@angular/cdk/testing/testbed';
import { inputBinding, signal } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { MatButtonHarness } from '@angular/material/button/testing';
import { MatSliderHarness } from '@angular/material/slider/testing';

import { type Beat, FULL } from '../../../../shared/radio/listen/audible-beats';
import { Listen } from './listen';
import { MAKE_AUDIO } from './tone-player';

class FakeParam {
  value = 0;

  setTargetAtTime(value: number): void {
    this.value = value;
  }
}

class FakeNode {
  readonly gain = new FakeParam();
  readonly frequency = new FakeParam();
  readonly threshold = new FakeParam();
  readonly knee = new FakeParam();
  readonly ratio = new FakeParam();
  readonly attack = new FakeParam();
  readonly release = new FakeParam();
  readonly into: FakeNode[] = [];
  isStarted = false;
  isStopped = false;

  connect(node: FakeNode): void {
    this.into.push(node);
  }

  start(): void {
    this.isStarted = true;
  }

  stop(): void {
    this.isStopped = true;
  }
}

/** Keeps what would sound. */
class FakeAudio {
  readonly currentTime = 0;
  readonly destination = new FakeNode();
  readonly oscillators: FakeNode[] = [];
  readonly limiters: FakeNode[] = [];
  isClosed = false;

  createGain(): FakeNode {
    return new FakeNode();
  }

  createOscillator(): FakeNode {
    const made = new FakeNode();
    this.oscillators.push(made);
    return made;
  }

  createDynamicsCompressor(): FakeNode {
    const made = new FakeNode();
    this.limiters.push(made);
    return made;
  }

  resume(): Promise<void> {
    return Promise.resolve();
  }

  close(): Promise<void> {
    this.isClosed = true;
    return Promise.resolve();
  }

  /** Pitch and amplitude of each tone that sounds. */
  get tones(): { pitch: number; amplitude: number }[] {
    return this.oscillators
      .filter(({ isStarted, isStopped }) => isStarted && !isStopped)
      .map(({ frequency, into }) => ({
        pitch: frequency.value,
        amplitude: into[0]?.gain.value ?? 0,
      }))
      .filter(({ amplitude }) => amplitude > 0);
  }
}

class ListenHarness extends ComponentHarness {
  static hostSelector = 'app-listen';

  private readonly button = this.locatorFor(MatButtonHarness);
  private readonly slider = this.locatorFor(MatSliderHarness);
  private readonly status = this.locatorFor('[role="status"]');

  async press(): Promise<void> {
    await (await this.button()).click();
  }

  async label(): Promise<string> {
    return (await this.button()).getText();
  }

  async isOffered(): Promise<boolean> {
    return !(await (await this.button()).isDisabled());
  }

  async turnTo(percent: number): Promise<void> {
    await (await (await this.slider()).getEndThumb()).setValue(percent);
  }

  async words(): Promise<string> {
    return (await this.status()).text();
  }
}

const two: Beat[] = [
  { pitchHz: 1000, levelDb: -10 },
  { pitchHz: 3000, levelDb: -30 },
];

async function open(beats: readonly Beat[], make?: () => AudioContext) {
  const made: FakeAudio[] = [];
  const fake = () => {
    const audio = new FakeAudio();
    made.push(audio);
    return audio as unknown as AudioContext;
  };
  TestBed.configureTestingModule({ providers: [{ provide: MAKE_AUDIO, useValue: make ?? fake }] });
  const given = signal(beats);
  const fixture = TestBed.createComponent(Listen, { bindings: [inputBinding('beats', given)] });
  const listen = await TestbedHarnessEnvironment.harnessForFixture(fixture, ListenHarness);
  return { listen, made, given, fixture };
}

describe('listening to the beats', () => {
  it('makes no sound, nor anything that could, before it is pressed', async () => {
    const { listen, made } = await open(two);

    expect(made).toEqual([]);
    expect(await listen.label()).toContain('Listen');
    expect(await listen.words()).toBe('A tone of 1000 Hz; 3000 Hz, 20 dB softer.');
  });

  it('plays each beat at its pitch and relative level, through a limiter', async () => {
    const { listen, made } = await open(two);
    await listen.press();
    const [audio] = made;

    expect(audio?.tones.map(({ pitch }) => pitch)).toEqual([1000, 3000]);
    const [loud, soft] = audio?.tones ?? [];
    expect((loud?.amplitude ?? NaN) / (soft?.amplitude ?? NaN)).toBeCloseTo(10, 9);
    expect((loud?.amplitude ?? 0) + (soft?.amplitude ?? 0)).toBeCloseTo(FULL, 9);
    expect(audio?.limiters[0]?.into).toEqual([audio?.destination]);
    expect(await listen.words()).toMatch(/^Playing:/);
  });

  it('follows the pointer to other beats', async () => {
    const { listen, made, given } = await open(two);
    await listen.press();
    given.set([{ pitchHz: 450, levelDb: null }]);
    expect(await listen.words()).toContain('450 Hz');

    expect(made[0]?.tones).toEqual([{ pitch: 450, amplitude: FULL }]);
  });

  it('is turned down by its volume control', async () => {
    const { listen, made } = await open(two);
    await listen.press();
    await listen.turnTo(10);
    const master = made[0]?.oscillators[0]?.into[0]?.into[0];

    expect(master?.gain.value).toBeCloseTo(0.1, 9);
  });

  it('falls silent when it is stopped, and when the page is left', async () => {
    const { listen, made, fixture } = await open(two);
    await listen.press();
    await listen.press();
    await new Promise((resolve) => setTimeout(resolve, 200));
    expect(made[0]).toMatchObject({ isClosed: true, tones: [] });

    await listen.press();
    fixture.destroy();
    await new Promise((resolve) => setTimeout(resolve, 200));
    expect(made[1]).toMatchObject({ isClosed: true, tones: [] });
  });

  it('is not offered where nothing beats, and says why', async () => {
    const { listen } = await open([{ pitchHz: 0, levelDb: 0 }]);

    expect(await listen.isOffered()).toBe(false);
    expect(await listen.words()).toContain('zero beat');
  });

  it('says so where the browser gives no sound', async () => {
    const { listen } = await open(two, () => {
      throw new Error('no audio');
    });
    await listen.press();

    expect(await listen.words()).toContain('This browser gives no sound.');
  });
});
