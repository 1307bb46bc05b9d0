// Takes the place of a native module that nobody compiled: the editor's log, appended to its file.
/* global exports, require */
/* eslint-disable @typescript-eslint/no-require-imports -- it is loaded as CommonJS */
'use strict';

const { appendFileSync, mkdirSync } = require('node:fs');
const { dirname } = require('node:path');

const levels = ['trace', 'debug', 'info', 'warn', 'error', 'critical'];
const off = levels.length;

class Logger {
  constructor(_type, _name, file) {
    this.file = file;
    this.level = levels.indexOf('info');
    mkdirSync(dirname(file), { recursive: true });
  }
  getLevel() {
    return this.level;
  }
  setLevel(level) {
    this.level = level;
  }
  setPattern() {}
  clearFormatters() {}
  flush() {}
  drop() {
    this.level = off;
  }
}
levels.forEach((name, level) => {
  Logger.prototype[name] = function (message) {
    if (level < this.level) return;
    try {
      appendFileSync(this.file, `${new Date().toISOString()} [${name}] ${message}\n`);
    } catch {
      // The folder goes away at the end of a run, and the last words of a process may come after that.
    }
  };
});

exports.version = 0;
exports.setLevel = () => {};
exports.setFlushOn = () => {};
exports.Logger = Logger;
const create = async (type, name, file) => new Logger(type, name, file);
exports.createRotatingLogger = (name, file) => create('rotating', name, file);
exports.createAsyncRotatingLogger = (name, file) => create('rotating_async', name, file);
