import { describe, expect, it } from 'vitest';
import { findObstacle, nameCameraProblem } from '../../../../src/features/scan/reader/cameraProblem';
import { planFrame } from '../../../../src/features/scan/reader/frames';
import { createRepeatGuard } from '../../../../src/features/scan/repeatGuard';

describe('camera problems', () => {
  it('tells a plain http page from a browser that has no camera at all', () => {
    expect(findObstacle({ isSecureContext: false, hasMediaDevices: false })).toBe('insecure');
    expect(findObstacle({ isSecureContext: true, hasMediaDevices: false })).toBe('unsupported');
    expect(findObstacle({ isSecureContext: true, hasMediaDevices: true })).toBeNull();
  });

  it.each([
    ['NotAllowedError', 'refused'],
    ['NotFoundError', 'none'],
    ['NotReadableError', 'busy'],
    ['SomethingNewError', 'unknown'],
  ])('gives %s (Media Capture and Streams) the problem %s', (name, problem) => {
    expect(nameCameraProblem(new DOMException('', name))).toBe(problem);
  });

  it('survives a thrown thing that is no error', () => {
    expect(nameCameraProblem(false)).toBe('unknown');
  });
});

describe('frames', () => {
  it('keeps a small camera’s picture as it is', () => {
    expect(planFrame(2, 640, 480)).toEqual({
      x: 0,
      y: 0,
      width: 640,
      height: 480,
      drawnWidth: 640,
      drawnHeight: 480,
    });
  });

  it('reduces a large picture, and every third time takes its middle in full sharpness', () => {
    expect(planFrame(0, 1920, 1080)).toMatchObject({ width: 1920, drawnWidth: 1280, drawnHeight: 720 });
    expect(planFrame(2, 1920, 1080)).toEqual({
      x: 480,
      y: 270,
      width: 960,
      height: 540,
      drawnWidth: 960,
      drawnHeight: 540,
    });
  });
});

describe('a label that stays in view', () => {
  it('is one scan, until it was out of view for a while', () => {
    const guard = createRepeatGuard();
    expect(guard.isNew('A', 0)).toBe(true);
    expect(guard.isNew('A', 1000)).toBe(false);
    expect(guard.isNew('A', 2000)).toBe(false);
    expect(guard.isNew('A', 3600)).toBe(true);
  });

  it('makes way for another at once', () => {
    const guard = createRepeatGuard();
    guard.isNew('A', 0);
    expect(guard.isNew('B', 10)).toBe(true);
  });

  it('is not read again right after its answer was closed', () => {
    const guard = createRepeatGuard();
    guard.settle('A', 0);
    expect(guard.isNew('A', 2900)).toBe(false);
    expect(guard.isNew('A', 4300)).toBe(false);
    expect(guard.isNew('A', 9000)).toBe(true);
  });
});
