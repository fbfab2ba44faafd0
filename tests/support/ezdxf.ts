/** Debian's python3-ezdxf, where it is installed: what it says of DXF files. */

import { execFileSync, spawnSync } from 'node:child_process';
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';

const python = '/usr/bin/python3';
export const hasEzdxf = spawnSync(python, ['-c', 'import ezdxf']).status === 0;

const script = `
import ezdxf, pathlib, sys
for path in sorted(pathlib.Path(sys.argv[1]).glob('*.dxf')):
    document = ezdxf.readfile(path)
    auditor = document.audit()
    lines = document.modelspace().query('LWPOLYLINE')
    print(len(auditor.errors), len(auditor.fixes), document.units, all(l.closed for l in lines))
`;

/** One line a file: errors, fixes, units (4 is mm), and whether every LWPOLYLINE is closed. */
export function auditDxf(
  files: readonly { readonly name: string; readonly text: string }[],
): string[] {
  const folder = mkdtempSync(join(tmpdir(), 'vaneloft-dxf-'));
  try {
    for (const { name, text } of files) writeFileSync(join(folder, name), text);
    const said = execFileSync(python, ['-c', script, folder], { encoding: 'utf8' });
    return said.trim().split('\n');
  } finally {
    rmSync(folder, { recursive: true });
  }
}
