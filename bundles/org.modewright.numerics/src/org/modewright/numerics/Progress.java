package org.modewright.numerics;

/** Receives the progress of long work and tells it when to stop. */
public interface Progress {

    /** Reports nowhere and never cancels. */
    Progress NONE = new Progress() {
        @Override
        public void report(String stage, double fraction) {
            // nobody listens
        }

        @Override
        public boolean isCancelled() {
            return false;
        }
    };

    /**
     * Tells how far the present stage has come.
     *
     * @param stage what is being done, in words for the user
     * @param fraction share of the stage that is done, 0 to 1, or NaN if unknown
     */
    void report(String stage, double fraction);

    /** Whether the work shall stop; long work asks several times a second. */
    boolean isCancelled();

    /**
     * Ends the work if it shall stop.
     *
     * @throws CancelledException if {@link #isCancelled()}
     */
    default void checkCancelled() {
        if (isCancelled()) {
            throw new CancelledException();
        }
    }
}
