/** Runs one benchmark, prints its lines and fails when one is far off its aim. */
const { run } = await import(process.argv[2]);
for (const { text, farOff } of await run()) {
  console.log(`  ${text}`);
  if (farOff) process.exitCode = 1;
}
