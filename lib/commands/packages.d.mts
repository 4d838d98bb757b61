interface Entry {
  readonly version?: string;
  readonly optional?: boolean;
  readonly link?: boolean;
}

export function missingPackages(
  wanted: Readonly<Record<string, Entry>>,
  installed: Readonly<Record<string, Entry>>,
): string[];
export function installPackages(root: string): Promise<void>;
