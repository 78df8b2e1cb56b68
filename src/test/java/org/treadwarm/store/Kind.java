package org.treadwarm.store;

import java.nio.file.Path;

/** The databases that every test of the store runs against. */
public enum Kind {
    SQLITE {
        @Override
        public DataHome emptyHome(Path folder) {
            return DataHome.folder(folder);
        }
    },
    POSTGRESQL {
        @Override
        public DataHome emptyHome(Path folder) {
            return TestPostgres.emptyHome();
        }
    };

    /**
     * A new, empty place.
     *
     * @param folder for what is kept in a folder
     */
    public abstract DataHome emptyHome(Path folder);
}
