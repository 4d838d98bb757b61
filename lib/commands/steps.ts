import { throwIfStopping } from './ending';

export type Log = (line: string) => void;

const seconds = (began: number): string => `${((performance.now() - began) / 1000).toFixed(1)} s`;

/**
 * Says what is being done, does it, and says how long it took: `Starting the database … 0.8 s`. Lines that
 * the work logs stand below it.
 */
export async function step<T>(name: string, work: (log: Log) => Promise<T>): Promise<T> {
  throwIfStopping();
  const began = performance.now();
  let open = true;
  process.stdout.write(`${name} … `);
  const breakLine = (): void => {
    if (open) process.stdout.write('\n');
    open = false;
  };
  try {
    const result = await work((line) => {
      breakLine();
      process.stdout.write(`  ${line}\n`);
    });
    process.stdout.write(open ? `${seconds(began)}\n` : `  ${seconds(began)}\n`);
    return result;
  } catch (error) {
    process.stdout.write(open ? `failed after ${seconds(began)}\n` : `  failed after ${seconds(began)}\n`);
    throw error;
  }
}

export const say: Log = (line) => {
  process.stdout.write(`${line}\n`);
};
