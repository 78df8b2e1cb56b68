package org.treadwarm.web;

import io.restassured.filter.Filter;
import io.restassured.filter.FilterContext;
import io.restassured.response.Response;
import io.restassured.specification.FilterableRequestSpecification;
import io.restassured.specification.FilterableResponseSpecification;
import java.net.URI;

/** Holds every answer that passes through it to the contract. */
record ContractFilter(Contract contract) implements Filter {
    @Override
    public Response filter(
            FilterableRequestSpecification request, FilterableResponseSpecification expected, FilterContext context) {
        Response response = context.next(request, expected);
        contract.check(
                request.getMethod(),
                URI.create(request.getURI()).getPath(),
                response.statusCode(),
                response.contentType(),
                response.asString());
        return response;
    }
}
