// Refuses a Node.js that is too old, before anything is loaded that it could not read.
// Kept to syntax that old versions understand.

const least = [20, 19];

/**
 * Loads and runs a script's body when this Node.js is new enough; says so and ends when it is not.
 * The body is loaded only then, so that an old version never meets syntax it does not know.
 */
export function onNode(load) {
  const parts = process.versions.node.split('.').map(Number);
  if (parts[0] > least[0] || (parts[0] === least[0] && parts[1] >= least[1])) {
    return load();
  }
  process.stderr.write(
    `Second Spanner needs Node.js ${least.join('.')} or newer; this is ${process.versions.node}. ` +
      'Install a newer Node.js and start again.\n',
  );
  process.exit(1);
}
