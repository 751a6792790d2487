import path from 'node:path';
import ts from 'typescript';
import { subjects, type Subject } from '../../server/contract/ability';
import { filesBelow, root } from './sources';

/** A line the server may write into the trail: its fields, however deep, with their values where these are a closed list. */
export interface AuditLine {
  subject: Subject;
  fields: Map<string, Set<string>>;
}

/** What the server's types say of its acts and of what they write down. */
export function auditTrail(): { acts: string[]; lines: AuditLine[] } {
  const files = filesBelow('server').map((file) => path.join(root, file));
  const { options } = ts.parseJsonConfigFileContent(ts.readConfigFile(path.join(root, 'tsconfig.json'), ts.sys.readFile).config, ts.sys, root);
  const program = ts.createProgram(files, options);
  const checker = program.getTypeChecker();
  const calls = files.flatMap((file) => callsIn(program.getSourceFile(file)));
  return { acts: [...new Set(calls.flatMap(actOf))], lines: calls.flatMap((call) => lineOf(call, checker)) };
}

function callsIn(source: ts.SourceFile | undefined): ts.CallExpression[] {
  const found: ts.CallExpression[] = [];
  const visit = (node: ts.Node): void => {
    if (ts.isCallExpression(node)) found.push(node);
    ts.forEachChild(node, visit);
  };
  if (source) visit(source);
  return found;
}

/** The name of the act that a call runs. */
function actOf(call: ts.CallExpression): string[] {
  const called = calledName(call);
  const name = called === 'act' ? call.arguments[0] : called === 'runAction' ? call.arguments[2] : undefined;
  return name && ts.isStringLiteral(name) ? [name.text] : [];
}

function lineOf(call: ts.CallExpression, checker: ts.TypeChecker): AuditLine[] {
  const [named, , changes] = call.arguments;
  if (calledName(call) !== 'audit' || !named || !changes) return [];
  const subject = subjects.find((one) => ts.isStringLiteral(named) && named.text === one);
  if (!subject) throw new Error(`${call.getText()} names no subject`);
  const fields: AuditLine['fields'] = new Map();
  gather(checker.getTypeAtLocation(changes), '', fields, checker);
  return [{ subject, fields }];
}

function calledName({ expression }: ts.CallExpression): string {
  return ts.isPropertyAccessExpression(expression) ? expression.name.text : expression.getText();
}

function gather(type: ts.Type, field: string, fields: AuditLine['fields'], checker: ts.TypeChecker): void {
  if (type.flags & (ts.TypeFlags.Any | ts.TypeFlags.Unknown)) throw new Error(`nobody knows what ${field || 'a line of the trail'} holds`);
  if (type.isUnion()) for (const one of type.types) gather(one, field, fields, checker);
  else if (type.isStringLiteral()) fields.get(field)?.add(type.value);
  else if (checker.isArrayType(type) || checker.isTupleType(type)) {
    // Both are references to a generic type.
    for (const one of checker.getTypeArguments(type as ts.TypeReference)) gather(one, field, fields, checker);
  } else if (type.flags & (ts.TypeFlags.Object | ts.TypeFlags.Intersection)) {
    for (const property of type.getProperties()) {
      if (!fields.has(property.name)) fields.set(property.name, new Set());
      gather(checker.getTypeOfSymbol(property), property.name, fields, checker);
    }
  }
}
