import { posix } from 'node:path';
import ts from 'typescript';
import type { Source } from './sources.ts';

/** One place where a file names another module. */
export interface Reference {
  readonly specifier: string;
  /** False for what the compiler erases: `import type`, `export type`, `import('…').T`. */
  readonly runtime: boolean;
  /** Path from the root for a relative specifier; null for a package. */
  readonly target: string | null;
}

export interface Syntax {
  readonly source: Source;
  readonly references: readonly Reference[];
  /** Lines of dynamic imports whose module cannot be read from the text. */
  readonly unreadable: readonly number[];
  /** Names used that this file does not declare, `Math.random` in full, with their lines. */
  readonly freeNames: readonly { readonly name: string; readonly line: number }[];
  /** Text that may reach the screen: string literals, template pieces, JSX text. */
  readonly texts: readonly { readonly text: string; readonly line: number }[];
}

/** The part of a node that names a module, if it does; 'unreadable' when it is computed. */
function moduleNamed(node: ts.Node): { name: ts.Node; runtime: boolean } | 'unreadable' | undefined {
  if (ts.isImportDeclaration(node)) return { name: node.moduleSpecifier, runtime: !erased(node.importClause) };
  if (ts.isExportDeclaration(node) && node.moduleSpecifier) return { name: node.moduleSpecifier, runtime: !node.isTypeOnly };
  if (ts.isImportTypeNode(node)) return { name: node.argument, runtime: false };
  const first = ts.isCallExpression(node) || ts.isNewExpression(node) ? node.arguments?.[0] : undefined;
  if (first === undefined) return undefined;
  const literal = ts.isStringLiteralLike(first);
  if (ts.isCallExpression(node)) {
    const callee = node.expression;
    const loads = callee.kind === ts.SyntaxKind.ImportKeyword
      || (ts.isIdentifier(callee) && callee.text === 'require')
      || (ts.isPropertyAccessExpression(callee) && ts.isMetaProperty(callee.expression) && callee.name.text === 'glob');
    if (loads) return literal ? { name: first, runtime: true } : 'unreadable';
  }
  if (ts.isNewExpression(node) && node.expression.getText() === 'URL' && node.arguments?.[1]?.getText() === 'import.meta.url') {
    return literal ? { name: first, runtime: true } : 'unreadable';
  }
  return undefined;
}

function erased(clause: ts.ImportClause | undefined): boolean {
  if (clause === undefined) return false;
  if (clause.phaseModifier === ts.SyntaxKind.TypeKeyword) return true;
  const names = clause.namedBindings;
  return clause.name === undefined && names !== undefined && ts.isNamedImports(names)
    && names.elements.length > 0 && names.elements.every((element) => element.isTypeOnly);
}

/** Whether an identifier reads a name, as against naming a member, a key or a type's field. */
function readsName(node: ts.Identifier): boolean {
  const { parent } = node;
  if (ts.isPropertyAccessExpression(parent) || ts.isQualifiedName(parent)) return (ts.isPropertyAccessExpression(parent) ? parent.expression : parent.left) === node;
  if (ts.isPropertyAssignment(parent)) return parent.initializer === node;
  if (ts.isBindingElement(parent)) return parent.initializer === node;
  if (ts.isImportSpecifier(parent) || ts.isExportSpecifier(parent) || ts.isJsxAttribute(parent)) return false;
  return !((ts.isPropertySignature(parent) || ts.isMethodSignature(parent) || ts.isPropertyDeclaration(parent)
    || ts.isMethodDeclaration(parent) || ts.isTypeReferenceNode(parent) || ts.isLabeledStatement(parent)
    || ts.isNamedTupleMember(parent) || ts.isLiteralTypeNode(parent)) && (parent as { name?: ts.Node }).name === node);
}

function declaredNames(file: ts.SourceFile): Set<string> {
  const names = new Set<string>();
  const visit = (node: ts.Node): void => {
    const name = (ts.isVariableDeclaration(node) || ts.isParameter(node) || ts.isBindingElement(node) || ts.isFunctionDeclaration(node)
      || ts.isClassDeclaration(node) || ts.isImportSpecifier(node) || ts.isImportClause(node) || ts.isNamespaceImport(node))
      ? node.name : undefined;
    if (name !== undefined && ts.isIdentifier(name)) names.add(name.text);
    ts.forEachChild(node, visit);
  };
  visit(file);
  return names;
}

function fullName(node: ts.Identifier): string {
  const { parent } = node;
  if (node.text !== 'Math') return node.text;
  // `Math` on its own, or indexed, could be a way round to Math.random: it is reported as that.
  return ts.isPropertyAccessExpression(parent) && parent.expression === node ? `Math.${parent.name.text}` : 'Math.random';
}

/** Reads one file with the compiler's own parser, so that comments and strings are never mistaken for code. */
export function parse(source: Source): Syntax {
  const file = ts.createSourceFile(source.path, source.text, ts.ScriptTarget.ES2023, true);
  const declared = declaredNames(file);
  const references: Reference[] = [];
  const unreadable: number[] = [];
  const freeNames: { name: string; line: number }[] = [];
  const texts: { text: string; line: number }[] = [];
  const lineOf = (node: ts.Node): number => file.getLineAndCharacterOfPosition(node.getStart()).line + 1;
  const visit = (node: ts.Node): void => {
    const named = moduleNamed(node);
    if (named === 'unreadable') unreadable.push(lineOf(node));
    else if (named !== undefined) {
      const specifier = named.name.getText().slice(1, -1);
      const target = specifier.startsWith('.') ? posix.normalize(posix.join(posix.dirname(source.path), specifier)) : null;
      references.push({ specifier, runtime: named.runtime, target });
    } else if (ts.isIdentifier(node) && readsName(node) && !declared.has(node.text)) {
      freeNames.push({ name: fullName(node), line: lineOf(node) });
    } else if (ts.isTaggedTemplateExpression(node) && node.tag.getText() === 'String.raw') {
      // Raw text is the source of a pattern, never a sentence; what is put into it is still code.
      if (ts.isTemplateExpression(node.template)) for (const { expression } of node.template.templateSpans) visit(expression);
      return;
    } else if (ts.isStringLiteralLike(node) || ts.isTemplateLiteralToken(node) || ts.isJsxText(node)) {
      texts.push({ text: node.text, line: lineOf(node) });
    }
    ts.forEachChild(node, visit);
  };
  visit(file);
  return { source, references, unreadable, freeNames, texts };
}
