package ropewalk.collection;

/**
 * How much is read at a time.
 *
 * @param blockRows  the most rows, good and rejected together, that a block holds; at least 1
 * @param blockBytes a block ends with the row that reaches this many bytes; at least 1
 * @param rowBytes   a row of more bytes is rejected and not kept in memory; at least 1
 */
public record ReadingLimits(int blockRows, int blockBytes, int rowBytes) {

    private static final int LARGEST_ROW = 256 << 20;

    /**
     * Checks the numbers. {@code rowBytes} is lowered to an eighth of the memory that the virtual machine may use, so that
     * a row, its copy in a block, and the block before it fit.
     *
     * @param blockRows rows
     * @param blockBytes bytes of a block
     * @param rowBytes bytes of a row
     * @throws IllegalArgumentException if one is less than 1
     */
    public ReadingLimits {
        if (blockRows < 1 || blockBytes < 1 || rowBytes < 1) {
            throw new IllegalArgumentException("blockRows " + blockRows + ", blockBytes " + blockBytes + ", rowBytes "
                    + rowBytes + "; each must be at least 1");
        }
        blockBytes = Math.min(blockBytes, LARGEST_ROW);
        rowBytes = (int) Math.min(Math.min(rowBytes, LARGEST_ROW), Math.max(1, Runtime.getRuntime().maxMemory() / 8));
    }

    /**
     * 256 rows or 128 KiB a block; rows up to 256 MiB, or an eighth of the memory if that is less.
     *
     * @return the limits to use unless there is a reason for others
     */
    public static ReadingLimits standard() {
        return new ReadingLimits(256, 128 << 10, LARGEST_ROW);
    }
}
