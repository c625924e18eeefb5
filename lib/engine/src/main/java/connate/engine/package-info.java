/**
 * What stands beside a workbook's commands while they run: the words that they use ({@link
 * connate.engine.Vocabulary}, read it first), the rendering of their values ({@link
 * connate.engine.Rendering}), and the process that runs them ({@link connate.engine.EngineMain}).
 */
package connate.engine;
