/** The languages that the specifications are written in. */
import { cHost, cppHost } from './c.ts';
import { fortranHost } from './fortran.ts';
import type { Host } from './host.ts';
import { javascriptHost, typescriptHost } from './javascript.ts';
import { juliaHost } from './julia.ts';
import { matlabHost } from './matlab.ts';
import { pythonHost } from './python.ts';

export const hosts: readonly Host[] = [pythonHost, matlabHost, juliaHost, fortranHost, cHost, cppHost, javascriptHost, typescriptHost];
