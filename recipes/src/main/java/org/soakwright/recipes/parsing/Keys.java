package org.soakwright.recipes.parsing;

import java.util.List;

/** Which keys may stand in a section of a file. */
interface Keys {
    /** With its article, for messages. */
    String label();

    /** Every key that means something here. */
    List<String> keys();

    /** Keys of the language that this version cannot compute here. */
    List<String> later();

    /** Where a key that is unknown here belongs; empty for one that is unknown everywhere. */
    String home(String key);
}
