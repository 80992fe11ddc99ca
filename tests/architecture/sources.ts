import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';
import ts from 'typescript';

const ROOT = process.cwd();

/** Every source file below a folder, as paths from the root. */
export function filesBelow(folder: string, end = /\.tsx?$/): string[] {
  return readdirSync(join(ROOT, folder), { withFileTypes: true })
    .flatMap((entry) =>
      entry.isDirectory() ? filesBelow(`${folder}/${entry.name}`, end) : [`${folder}/${entry.name}`],
    )
    .filter((file) => end.test(file))
    .sort();
}

export const textOf = remembered((file: string): string => readFileSync(join(ROOT, file), 'utf8'));

const sourceOf = remembered((file: string) =>
  ts.createSourceFile(file, textOf(file), ts.ScriptTarget.Latest, true),
);

interface FunctionSource {
  file: string;
  name: string;
  isExported: boolean;
  parameters: string[];
  /** What it calls, by name. */
  calls: string[];
  /** The text of its first statement. */
  first: string;
}

/** The functions that a file declares at its top, with what they call. */
export const functionsOf = remembered((file: string): FunctionSource[] => {
  return sourceOf(file).statements.flatMap((statement) => {
    if (ts.isFunctionDeclaration(statement) && statement.name && statement.body)
      return [
        functionSource(
          { file, name: statement.name.text, isExported: isExported(statement) },
          statement,
          statement.body,
        ),
      ];
    if (!ts.isVariableStatement(statement)) return [];
    return statement.declarationList.declarations.flatMap(({ name, initializer }) =>
      ts.isIdentifier(name) && initializer && ts.isArrowFunction(initializer)
        ? [
            functionSource(
              { file, name: name.text, isExported: isExported(statement) },
              initializer,
              initializer.body,
            ),
          ]
        : [],
    );
  });
});

function functionSource(
  named: Pick<FunctionSource, 'file' | 'name' | 'isExported'>,
  node: ts.FunctionDeclaration | ts.ArrowFunction,
  body: ts.ConciseBody,
): FunctionSource {
  return {
    ...named,
    parameters: node.parameters.map((parameter) => parameter.type?.getText() ?? ''),
    calls: callsIn(body),
    first: ts.isBlock(body) ? (body.statements[0]?.getText() ?? '') : body.getText(),
  };
}

const isExported = (node: ts.Node): boolean =>
  ts.canHaveModifiers(node) &&
  (ts.getModifiers(node)?.some((modifier) => modifier.kind === ts.SyntaxKind.ExportKeyword) ?? false);

function callsIn(body: ts.Node): string[] {
  const calls: string[] = [];
  const visit = (node: ts.Node): void => {
    if (ts.isCallExpression(node) && ts.isIdentifier(node.expression)) calls.push(node.expression.text);
    // A function that is handed on (`then(() => f)`, `work(f)`) counts as called by whoever hands it on.
    if (ts.isIdentifier(node) && ts.isCallExpression(node.parent) && node.parent.arguments.includes(node))
      calls.push(node.text);
    ts.forEachChild(node, visit);
  };
  visit(body);
  return calls;
}

/** Where the names of a file come from: local name → the file that exports it, and the name there. */
export const importsOf = remembered((file: string): Map<string, { from: string; name: string }> => {
  const source = sourceOf(file);
  const found = new Map<string, { from: string; name: string }>();
  for (const statement of source.statements) {
    if (!ts.isImportDeclaration(statement) || !ts.isStringLiteral(statement.moduleSpecifier)) continue;
    const from = resolve(file, statement.moduleSpecifier.text);
    const bindings = statement.importClause?.namedBindings;
    if (from === null || !bindings) continue;
    if (ts.isNamespaceImport(bindings)) found.set(bindings.name.text, { from, name: '*' });
    else
      for (const element of bindings.elements)
        found.set(element.name.text, { from, name: (element.propertyName ?? element.name).text });
  }
  return found;
});

/** A file is read and parsed once, however many rules look at it. */
function remembered<T>(make: (file: string) => T): (file: string) => T {
  const known = new Map<string, T>();
  return (file) => {
    const found = known.get(file) ?? make(file);
    known.set(file, found);
    return found;
  };
}

function resolve(file: string, specifier: string): string | null {
  if (!specifier.startsWith('.') && !specifier.startsWith('@/')) return null;
  const path = specifier.startsWith('@/') ? specifier.slice(2) : join(file, '..', specifier);
  for (const end of ['.ts', '.tsx']) {
    try {
      readFileSync(join(ROOT, path + end));
      return path + end;
    } catch {
      // The other ending, then.
    }
  }
  return null;
}
