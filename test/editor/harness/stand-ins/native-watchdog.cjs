// Takes the place of a native module that nobody compiled: ends this process when its parent is gone.
/* global exports, process, setInterval */
'use strict';

const parentGone = 87;

exports.start = (pid) => {
  setInterval(() => {
    try {
      process.kill(pid, 0);
    } catch {
      process.exit(parentGone);
    }
  }, 3000).unref();
};

exports.exit = (code) => process.exit(code || 0);
