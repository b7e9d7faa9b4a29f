declare const dialectModule: object;
export = dialectModule;
