# Bases of one's own are named with --build-arg: a JDK 17 with Maven to build, a Java 17 runtime to run.
ARG BUILD_BASE=maven:3.9-eclipse-temurin-17
ARG RUN_BASE=eclipse-temurin:17-jre

# Build: the jar, with the program's own tests left to "mvn verify".
FROM ${BUILD_BASE} AS build
WORKDIR /src
COPY pom.xml .
COPY .mvn .mvn
COPY src src
COPY templates templates
COPY static static
RUN mvn -B -ntp -q -DskipTests package

# Run: a JRE, the jar, a user without rights, one volume for everything that is kept.
FROM ${RUN_BASE}
RUN useradd --system --uid 10001 --home-dir /data treadwarm && install -d -o treadwarm -m 700 /data
COPY --from=build /src/target/treadwarm.jar /opt/treadwarm.jar
# An archive of loaded classes shortens every start by a third.
RUN java -XX:ArchiveClassesAtExit=/opt/treadwarm.jsa -Xlog:cds=off -Xlog:cds+dynamic=off \
    -jar /opt/treadwarm.jar rehearse
USER treadwarm
VOLUME /data
EXPOSE 8080
HEALTHCHECK --interval=30s --timeout=5s --start-period=20s CMD \
  ["java", "-cp", "/opt/treadwarm.jar", "org.treadwarm.Treadwarm", "health", "--port", "8080"]
ENTRYPOINT ["java", "-XX:MaxRAMPercentage=60", "-XX:SharedArchiveFile=/opt/treadwarm.jsa", "-jar", "/opt/treadwarm.jar"]
# The container listens on every address of its own; publish the port to loopback or behind a proxy that speaks TLS.
CMD ["serve", "--bind", "0.0.0.0", "--port", "8080", "--data", "/data"]
