/**
 * Chip-to-chip and device-to-device spread, the draw of one device, and its trim. Draws are keyed, so that changing one tolerance moves no other draw.
 */
package torqueloom.model.tolerance;
