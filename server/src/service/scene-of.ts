/** What was seen of a file's functions, kept as long as its text holds. */
import type { Understood } from '../analyze.ts';
import type { HostStyle } from '../frontends/frontend.ts';
import { Scene } from '../repairs/scene.ts';

const scenes = new WeakMap<Understood, Scene>();

/** The scene of a file: for hovers, hints, and what else looks at single places. */
export function sceneOf(understood: Understood, style: HostStyle): Scene {
  let scene = scenes.get(understood);
  if (!scene) {
    const { parsed, lines, notes, solver } = understood;
    scene = new Scene({ file: parsed.program.file, program: parsed.program, lines, notes, solver, style });
    scenes.set(understood, scene);
  }
  return scene;
}
