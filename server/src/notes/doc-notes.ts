/** Notes in the documentation of functions, classes and modules. */
import type { ClassStmt, DocText, Expr, FunctionStmt } from '../program/nodes.ts';
import { constructorOf } from '../program/objects.ts';
import type { Collector } from './collector.ts';
import { type DocEntry, type Documentation, plainEntries, readDocumentation } from './doc-entries.ts';
import { unitOfEntry } from './doc-unit.ts';
import { choose, type Found, lookForUnits } from './find-unit.ts';
import type { Line } from './doc-lines.ts';
import { isConverted } from './converted.ts';
import { returnedRecords } from './returned-records.ts';
import type { NoteTarget } from './types.ts';

/** Parameters and results of a function; of a constructor also the fields that its documentation lists. */
export function functionDocs(out: Collector, fn: FunctionStmt, owner: ClassStmt | undefined): void {
  if (!fn.doc || !mayHoldUnits(fn.doc)) return;
  const doc = named(out, readDocumentation(fn.doc));
  const params = new Map(fn.params.map((param) => [param.name, param]));
  readEntries(out, doc, (entry, name) => {
    if (entry.role === 'field') return owner && name !== undefined ? [{ kind: 'field', owner, name }] : [];
    const param = name === undefined ? undefined : (params.get(name) ?? params.get(inCode(name)));
    if (name !== undefined && params.has(name.slice(0, Math.max(name.indexOf('.'), 0)))) return [{ kind: 'symbol', owner: fn, name }];
    if (param) return [{ kind: 'parameter', owner: fn, param }, ...(param.intent ? outputTargets(fn, param.name) : [])];
    return outputTargets(fn, entry === doc.entries.at(-1) && isResult(out, fn, doc, name) ? fn.outputs?.[0]?.name : name);
  }, fn);
  if (isProperty(fn)) propertyNote(out, fn, doc);
  else if (!fn.outputs) summaryNotes(out, fn, doc);
  for (const entry of doc.entries) if (entry.role === 'result' && entry.lines && entry.type && isRecord(entry.type.text)) recordNotes(out, fn, doc, entry.lines);
}

/** Fields of a class, and its constructor's parameters where that says nothing of them itself. */
export function classDocs(out: Collector, cls: ClassStmt): void {
  if (!cls.doc || !mayHoldUnits(cls.doc)) return;
  const doc = readDocumentation(cls.doc);
  const constructor = constructorOf(cls);
  const said = new Set(constructor?.doc ? readDocumentation(constructor.doc).entries.flatMap((entry) => entry.names) : []);
  readEntries(out, doc, (entry, name) => {
    if (name === undefined || entry.role === 'result') return [];
    const param = said.has(name) || entry.role === 'field' ? undefined : constructor?.params.find((each) => each.name === name);
    const field: NoteTarget = { kind: 'field', owner: cls, name };
    return param && constructor ? [field, { kind: 'parameter', owner: constructor, param }] : [field];
  }, undefined);
}

/** Without a bracket, a parenthesis, a comma, a digit or "in", no form of note is there. */
function mayHoldUnits(doc: DocText): boolean {
  return /[[(,]|\bin\b|unit/i.test(doc.text);
}

type Targets = (entry: DocEntry, name: string | undefined) => readonly NoteTarget[];

function readEntries(out: Collector, doc: Documentation, targetsOf: Targets, fn: FunctionStmt | undefined): void {
  const all = doc.entries.filter((entry) => entry.role === 'result');
  // "Tuple of the following results:" above named results is no result.
  const results = all.some((entry) => entry.names.length > 0) ? all.filter((entry) => entry.names.length > 0) : all;
  const several = results.reduce((sum, entry) => sum + Math.max(entry.names.length, 1), 0) > 1 && !results.every((entry) => entry.names.length === 0 && entry.type === undefined);
  const told = new Set<string>();
  let position = 0;
  for (const entry of doc.entries) {
    if (entry.role === 'result') {
      if (!results.includes(entry)) continue;
      const names = entry.names.length > 0 ? entry.names : [undefined];
      const owners: readonly NoteTarget[] = fn?.outputs ? namesOfOutputs(fn, entry.names) : fn ? names.map((name, at) => ({ kind: 'result', owner: fn, ...(several ? { position: position + at } : {}), ...(name === undefined ? {} : { name }) })) : [];
      position += names.length;
      readEntry(out, doc, entry, owners);
      continue;
    }
    const fresh = entry.names.filter((name) => !told.has(`${entry.role}:${name}`));
    const targets = fresh.flatMap((name) => targetsOf(entry, name));
    if (readEntry(out, doc, entry, targets)) for (const name of fresh) told.add(`${entry.role}:${name}`);
  }
}

/** The names of a documentation as the code's form has them. */
function named(out: Collector, doc: Documentation): Documentation {
  return { ...doc, entries: doc.entries.map((entry) => ({ ...entry, names: entry.names.map((name) => out.name(name)) })) };
}

/** Behind all parameters, a name that the code does not know can only be another one for the result: `rho = density` of `fluid_rho(t, p)`. */
function isResult(out: Collector, fn: FunctionStmt, doc: Documentation, name: string | undefined): boolean {
  return name !== undefined && fn.outputs?.length === 1 && !out.names.occurs(name) && fn.params.every((param) => doc.entries.some((entry) => entry.names.includes(param.name)));
}

/** A help text that writes a name in capitals means the one in the code. */
function inCode(name: string): string {
  return name === name.toUpperCase() ? name.toLowerCase() : name;
}

/** A result without a name is the only output. */
function namesOfOutputs(fn: FunctionStmt, names: readonly string[]): readonly NoteTarget[] {
  const only = fn.outputs?.length === 1 ? fn.outputs[0]?.name : undefined;
  return names.length === 0 ? outputTargets(fn, only) : names.flatMap((name) => outputTargets(fn, name));
}

/** The result that an output variable holds, and the variable itself where every value it takes is of that unit. */
function outputTargets(fn: FunctionStmt, name: string | undefined): readonly NoteTarget[] {
  const outputs = fn.outputs ?? [];
  const exact = outputs.findIndex((each) => each.name === name);
  const position = exact >= 0 || name === undefined ? exact : outputs.findIndex((each) => each.name === inCode(name));
  const found = outputs[position]?.name;
  if (found === undefined) return [];
  const result: NoteTarget = { kind: 'result', owner: fn, ...(outputs.length > 1 ? { position } : {}), name: found };
  return isConverted(fn.body, found) || fn.params.some((each) => each.name === found) ? [result] : [result, { kind: 'symbol', owner: fn, name: found }];
}

function readEntry(out: Collector, doc: Documentation, entry: DocEntry, targets: readonly NoteTarget[]): boolean {
  const unit = unitOfEntry(out, entry, doc.citations, targets.length > 0);
  if (!unit || (entry.role === 'result' && entry.names.length < 2 && severalUnits(out, entry, doc.citations))) return false;
  if (targets.length === 0) out.leave(unit.piece, [unit.found]);
  for (const target of targets) out.note(target, unit.piece, unit.found, 'documentation');
  return true;
}

/** `currents [A], voltages [V], power [W]`: one entry that describes a tuple says nothing of the whole. */
function severalUnits(out: Collector, entry: DocEntry, citations: boolean): boolean {
  if (!entry.body || (entry.body.text.match(/\[/g)?.length ?? 0) < 2) return false;
  const { brackets } = lookForUnits(entry.body, { place: 'documentation', language: out.language, citations }, false, out.options('', entry.body.text));
  return new Set(brackets.filter((each) => !each.unit.dimension.isOne).map((each) => each.unit.dimension)).size > 2;
}

function isRecord(type: string): boolean {
  return /\b(?:dict|dictionary|OrderedDict|mapping|record)\b/i.test(type);
}

/** `* Q : heat flow, [W]` below a returned record: the unit of the entry with that key. */
function recordNotes(out: Collector, fn: FunctionStmt, doc: Documentation, lines: readonly Line[]): void {
  const entries = returnedRecords(fn).flatMap((record) => record.entries);
  for (const item of plainEntries(doc.text, lines)) {
    const targets = entries.filter((entry) => item.names.includes(entry.key)).map((entry): NoteTarget => ({ kind: 'entry', entry }));
    readEntry(out, doc, item, targets);
  }
}

function isProperty(fn: FunctionStmt): boolean {
  return fn.decorators.some((each) => /(?:^|_)property$/.test(lastName(each)));
}

function lastName(expr: Expr): string {
  return expr.kind === 'name' || expr.kind === 'member' ? expr.name : '';
}

/**
 * `"""Head of the pump [m] at flow Q [m3/s]"""`: a unit behind the name of a parameter is its own; the one that is left, before any
 * word that brings in a condition, is the result's.
 */
function summaryNotes(out: Collector, fn: FunctionStmt, doc: Documentation): void {
  const sentence = { text: /^\s*[^\n]*?(?:[.;](?=\s|$)|(?=\n|$))/.exec(doc.opening.text)?.[0] ?? '', start: doc.opening.start };
  if (!sentence.text.includes('[') || doc.entries.some((entry) => entry.role === 'result')) return;
  const { brackets } = out.look(sentence, 'documentation', out.options(fn.name, sentence.text), false, doc.citations);
  const rest: Found[] = [];
  for (const found of brackets) {
    const name = /([\p{L}_][\p{L}\p{N}_]*)\s*$/u.exec(sentence.text.slice(0, found.outer.start))?.[1];
    const param = fn.params.find((each) => each.name === name);
    if (!param) rest.push(found);
    else if (!doc.entries.some((entry) => entry.names.includes(param.name))) out.note({ kind: 'parameter', owner: fn, param }, sentence, found, 'documentation');
  }
  const only = rest.length === 1 ? rest[0] : undefined;
  const before = only && sentence.text.slice(0, only.outer.start);
  // Where every parameter is described, a bracket in the sentence can only be the result's.
  const told = fn.params.every((param) => /^(?:self|cls)$/.test(param.name) || doc.entries.some((entry) => entry.names.includes(param.name)));
  if (only && before && !action.test(before) && (told || !condition.test(before)) && !fn.params.some((each) => nameIn(before, each.name))) out.note({ kind: 'result', owner: fn }, sentence, only, 'documentation');
}

/** What follows may be a condition, and not the result. */
const condition = /\b(?:at|for|from|given|with|without|by|when|where|if|above|below|than|using|over|under|between|per|on|as|until|within)\b/i;
/** Sentences about what is done, and not about what comes out. */
const action = /\b(?:versus|vs|against|whether|into|set|sets|plot|plots|print|prints|show|shows|write|writes|takes?|convert|converts|read|reads)\b|[:?=]|->|→/i;

function nameIn(text: string, name: string): boolean {
  return name.length > 2 && new RegExp(`\\b${name}\\b`, 'i').test(text);
}

/** `"""Density of the paint [kg/m^3]."""` above a property is its result's unit. */
function propertyNote(out: Collector, fn: FunctionStmt, doc: Documentation): void {
  if (doc.entries.some((entry) => entry.role === 'result')) return;
  const opening = { text: /^\s*[^\n]*(?:\n[ \t]*\S[^\n]*)*/.exec(doc.opening.text)?.[0] ?? '', start: doc.opening.start };
  const { brackets } = out.look(opening, 'documentation', out.options(fn.name, opening.text), true, doc.citations);
  const found = choose(opening.text, brackets);
  if (found) out.note({ kind: 'result', owner: fn }, opening, found, 'documentation');
}
