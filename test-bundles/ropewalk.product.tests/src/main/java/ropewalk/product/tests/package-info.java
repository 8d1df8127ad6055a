/** The subcommands that tests pack into small jars and drop into the product. */
package ropewalk.product.tests;
