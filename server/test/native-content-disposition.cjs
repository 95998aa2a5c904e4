// An ES module that a CommonJS package requires: Node.js 20.19 can load it, Jest's own loader on Node.js 20 cannot.
module.exports = process.getBuiltinModule('node:module').createRequire(__filename)('content-disposition');
