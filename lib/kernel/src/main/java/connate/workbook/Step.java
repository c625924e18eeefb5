package connate.workbook;

import java.util.List;

/**
 * A run of prose and the commands under it, up to the next prose.
 *
 * @param index the number of the step in its workbook, counted from 0
 * @param prose the prose without its slashes, lines parted by {@code \n}; empty where the workbook
 *     begins with a command
 * @param proseLine the line on which the prose begins, counted from 1; 0 where there is none
 * @param commands the commands, possibly none
 */
public record Step(int index, String prose, int proseLine, List<Command> commands) {}
