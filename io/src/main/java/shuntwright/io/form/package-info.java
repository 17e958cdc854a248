/**
 * How an object of a file is laid out: each {@link shuntwright.io.form.Form} declares its keys once, and that one table
 * reads, checks, writes and documents the object. In comes a located JSON tree, out go values or problems; and back.
 */
@NullMarked
package shuntwright.io.form;

import org.jspecify.annotations.NullMarked;
